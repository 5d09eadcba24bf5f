package org.evendraft.ballast.optimum;

import java.util.Arrays;

/** The inverse of a basis, dense: some tens of rows, where nothing sparse would be faster. Mutable, for one solution. */
final class Inverse {
    /** A basis with a smaller pivot is taken as singular. */
    private static final double SINGULAR = 1e-11;

    private final int size;
    private final double[][] rows;

    Inverse(int size) {
        this.size = size;
        this.rows = new double[size][size];
    }

    /** Takes the inverse of these columns by Gauss and Jordan with row pivoting; false when they are dependent. */
    boolean of(Column[] columns) {
        double[][] matrix = new double[size][size];
        for (int j = 0; j < size; j++) {
            for (int k = 0; k < columns[j].rows.length; k++) {
                matrix[columns[j].rows[k]][j] = columns[j].entries[k];
            }
        }
        for (int i = 0; i < size; i++) {
            Arrays.fill(rows[i], 0);
            rows[i][i] = 1;
        }
        for (int j = 0; j < size; j++) {
            int p = largest(matrix, j);
            if (Math.abs(matrix[p][j]) < SINGULAR) {
                return false;
            }
            swap(matrix, p, j);
            swap(rows, p, j);
            clear(matrix, j);
        }
        return true;
    }

    private int largest(double[][] matrix, int column) {
        int best = column;
        for (int i = column + 1; i < size; i++) {
            if (Math.abs(matrix[i][column]) > Math.abs(matrix[best][column])) {
                best = i;
            }
        }
        return best;
    }

    private static void swap(double[][] m, int a, int b) {
        double[] row = m[a];
        m[a] = m[b];
        m[b] = row;
    }

    private void clear(double[][] matrix, int j) {
        double scale = 1 / matrix[j][j];
        scale(matrix[j], j, scale);
        scale(rows[j], 0, scale);
        for (int i = 0; i < size; i++) {
            double factor = matrix[i][j];
            if (i != j && factor != 0) {
                subtract(matrix[i], matrix[j], factor, j);
                subtract(rows[i], rows[j], factor, 0);
            }
        }
    }

    private void scale(double[] row, int from, double factor) {
        for (int k = from; k < size; k++) {
            row[k] *= factor;
        }
    }

    private void subtract(double[] row, double[] other, double factor, int from) {
        for (int k = from; k < size; k++) {
            row[k] -= factor * other[k];
        }
    }

    double[] row(int i) {
        return rows[i];
    }

    double squaredNorm(int i) {
        return rowTimes(i, rows[i]);
    }

    double rowTimes(int i, double[] vector) {
        double sum = 0;
        for (int k = 0; k < size; k++) {
            sum += rows[i][k] * vector[k];
        }
        return sum;
    }

    double[] times(Column column) {
        double[] product = new double[size];
        for (int i = 0; i < size; i++) {
            product[i] = column.times(rows[i]);
        }
        return product;
    }

    /** The inverse after the basic column of a row gave way to one whose image is given. */
    void replace(int row, double[] image) {
        scale(rows[row], 0, 1 / image[row]);
        for (int i = 0; i < size; i++) {
            if (i != row && image[i] != 0) {
                subtract(rows[i], rows[row], image[i], 0);
            }
        }
    }
}

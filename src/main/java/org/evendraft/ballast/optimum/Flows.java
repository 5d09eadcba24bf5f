package org.evendraft.ballast.optimum;

/** What pumps move: tank by pump, and from and to the sea. Immutable. */
public final class Flows {
    /** The pump of a tank that is not moved. */
    static final int NO_PUMP = -1;

    private final double[][] gained;
    private final double[] drawnFromSea;
    private final double[] toSea;

    Flows(double[][] gained, double[] drawnFromSea, double[] toSea) {
        this.gained = gained;
        this.drawnFromSea = drawnFromSea;
        this.toSea = toSea;
    }

    /** What a tank gains through a pump, negative for a loss (t). */
    public double gained(int tank, int pump) {
        return gained[tank][pump];
    }

    /** What a pump takes in from the sea (t). */
    public double fromSea(int pump) {
        return drawnFromSea[pump];
    }

    /** What a pump puts out to the sea (t). */
    public double toSea(int pump) {
        return toSea[pump];
    }

    /** What the pumps draw in all (t): each move counted once. */
    public double pumped() {
        double sum = 0;
        for (double[] tank : gained) {
            for (double amount : tank) {
                sum += Math.max(0, -amount);
            }
        }
        for (double amount : drawnFromSea) {
            sum += amount;
        }
        return sum;
    }
}

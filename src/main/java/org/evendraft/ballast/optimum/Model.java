package org.evendraft.ballast.optimum;

import java.util.List;

/**
 * A question to the optimiser.
 *
 * @param tanks the tanks, in the order of their names
 * @param pumps the pumps
 * @param rows the coupling rows
 */
public record Model(List<TankModel> tanks, List<SeaEnds> pumps, List<Row> rows) {

    /** Copies the lists. */
    public Model {
        tanks = List.copyOf(tanks);
        pumps = List.copyOf(pumps);
        rows = List.copyOf(rows);
    }

    /**
     * What of a pump's ends is the sea.
     *
     * @param draws whether it can draw from the sea
     * @param discharges whether it can deliver to the sea
     */
    public record SeaEnds(boolean draws, boolean discharges) {}

    /**
     * A coupling row: the effects of all tanks together stay at or under the bound.
     *
     * @param bound the bound, in the row's unit, from the state in which all tanks are untouched
     * @param weight what an excess counts for each unit when the rows cannot all be met
     */
    public record Row(double bound, double weight) {}

    /** The same question with other bounds. */
    public Model withRows(List<Row> other) {
        return new Model(tanks, pumps, other);
    }
}

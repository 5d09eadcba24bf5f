package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import java.util.List;
import org.evendraft.stability.HydrostaticRow;

/**
 * A table of hydrostatics. Component names are those of the JSON.
 *
 * @param platform id of the platform
 * @param name its name for people
 * @param waterDensity density of the water (t/m³)
 * @param rows by trim, then heel, then draft
 * @param provenance where the figures come from
 */
public record HydrostaticTable(
        String platform,
        String name,
        double waterDensity,
        List<HydrostaticRow> rows,
        @JsonUnwrapped Provenance provenance) {

    /** Copies the list. */
    public HydrostaticTable {
        rows = List.copyOf(rows);
    }
}

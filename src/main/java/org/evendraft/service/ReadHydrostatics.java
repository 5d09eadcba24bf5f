package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import java.util.List;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Platform;
import org.evendraft.stability.HydrostaticRow;
import org.evendraft.stability.Hydrostatics;

/** Hydrostatics of a platform by draft, heel and trim, in its own water unless another density is asked for. */
public final class ReadHydrostatics {
    private final PlatformShelf shelf;
    private final Provenance.Source source;

    ReadHydrostatics(PlatformShelf shelf, Provenance.Source source) {
        this.shelf = shelf;
        this.source = source;
    }

    /**
     * A row and where it comes from, on one level of JSON.
     *
     * @param row the row
     * @param waterDensity density of the water (t/m³)
     * @param provenance where the figures come from
     */
    public record TracedRow(
            @JsonUnwrapped HydrostaticRow row,
            double waterDensity,
            @JsonUnwrapped Provenance provenance) {}

    /**
     * A table of a stored platform.
     *
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException when no part of the hull is under water at one of the waterplanes
     */
    public HydrostaticTable table(String platform, HydrostaticRequest request) {
        return table(shelf.current(platform), request, source);
    }

    /**
     * The only row of a table, as an answer of its own.
     *
     * @param table a table of one row
     */
    public static TracedRow single(HydrostaticTable table) {
        return new TracedRow(table.rows().get(0), table.waterDensity(), table.provenance());
    }

    /**
     * A table of a platform that need not be stored.
     *
     * @throws FaultyDocumentException when no part of the hull is under water at one of the waterplanes
     */
    public static HydrostaticTable table(PlatformAtRevision at, HydrostaticRequest request, Provenance.Source source) {
        Platform platform = at.prepared().platform();
        double density = request.waterDensity().orElse(platform.waterDensity());
        List<HydrostaticRow> rows = Hydrostatics.table(at.prepared().hull(), density, request.grid());
        if (request.digits().isPresent()) {
            rows = rows.stream()
                    .map(new HydrostaticRounding(request.digits().getAsInt())::of)
                    .toList();
        }
        return new HydrostaticTable(platform.id(), platform.name(), density, rows, source.of(at.revision()));
    }
}

package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import java.util.List;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.stability.HydrostaticRow;
import org.evendraft.stability.Hydrostatics;
import org.evendraft.stability.Waterplane;

/** Hydrostatics of a stored platform in its own water, by draft, heel and trim. */
public final class ReadHydrostatics {
    private final PlatformShelf shelf;
    private final Provenance.Source source;

    ReadHydrostatics(PlatformShelf shelf, Provenance.Source source) {
        this.shelf = shelf;
        this.source = source;
    }

    /**
     * A table by draft. Component names are those of the JSON.
     *
     * @param waterDensity density of the water (t/m³)
     * @param rows one row for each draft
     * @param provenance where the figures come from
     */
    public record HydrostaticTable(
            double waterDensity,
            List<HydrostaticRow> rows,
            @JsonUnwrapped Provenance provenance) {

        /** Copies the list. */
        public HydrostaticTable {
            rows = List.copyOf(rows);
        }
    }

    /**
     * Drafts from one to another, both included, at one heel and trim.
     *
     * @param from first draft (m)
     * @param to last draft, at least the first (m)
     * @param step between drafts, over 0 (m)
     * @param heelAngle starboard down positive (degrees)
     * @param trimAngle bow down positive (degrees)
     */
    public record Drafts(double from, double to, double step, double heelAngle, double trimAngle) {}

    /**
     * The row at a draft of a platform that need not be stored.
     *
     * @throws FaultyDocumentException when no part of the hull is under water
     */
    public static HydrostaticRow row(PreparedPlatform prepared, Waterplane at) {
        return Hydrostatics.row(prepared.hull(), prepared.platform().waterDensity(), at);
    }

    /**
     * The row at a draft.
     *
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException when no part of the hull is under water
     */
    public HydrostaticRow row(String platform, Waterplane at) {
        return row(shelf.current(platform).prepared(), at);
    }

    /**
     * A table.
     *
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException when no part of the hull is under water at one of the drafts
     */
    public HydrostaticTable table(String platform, Drafts drafts) {
        PlatformAtRevision current = shelf.current(platform);
        double density = current.prepared().platform().waterDensity();
        Waterplane inclined = Waterplane.ofDegrees(drafts.from(), drafts.heelAngle(), drafts.trimAngle());
        List<HydrostaticRow> rows = Hydrostatics.table(
                current.prepared().hull(), density, drafts.from(), drafts.to(), drafts.step(), inclined);
        return new HydrostaticTable(density, rows, source.of(current.revision()));
    }
}

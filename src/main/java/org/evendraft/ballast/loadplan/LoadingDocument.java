package org.evendraft.ballast.loadplan;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Condition.FreeSurface;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Load;
import org.evendraft.platform.Mode;

/**
 * How a platform is loaded, in the form of a condition document, so that it can be posted as one.
 *
 * @param name its name for people
 * @param mode id of the mode in force
 * @param waterDensity density of the sea (t/m³)
 * @param freeSurface which free-surface moments the correction takes
 * @param fills contents of the tanks
 * @param loads what else is on board
 */
public record LoadingDocument(
        String name,
        Optional<String> mode,
        double waterDensity,
        FreeSurface freeSurface,
        List<Fill> fills,
        List<LoadEntry> loads) {

    /** Copies the lists. */
    public LoadingDocument {
        fills = List.copyOf(fills);
        loads = List.copyOf(loads);
    }

    /**
     * A load in the form of a condition document.
     *
     * @param name its name
     * @param kind what it is
     * @param area deck area it stands on
     * @param mass its mass (t)
     * @param x forward (m)
     * @param y to port (m)
     * @param z up from the keel (m)
     * @param footprint the area that carries it (m²)
     */
    public record LoadEntry(
            String name,
            Load.Kind kind,
            Optional<String> area,
            double mass,
            double x,
            double y,
            double z,
            OptionalDouble footprint) {

        static LoadEntry of(Load load) {
            return new LoadEntry(
                    load.name(),
                    load.kind(),
                    load.area(),
                    load.mass(),
                    load.position().x(),
                    load.position().y(),
                    load.position().z(),
                    load.footprint());
        }
    }

    static LoadingDocument of(Condition condition) {
        return new LoadingDocument(
                condition.name(),
                condition.mode().map(Mode::id),
                condition.waterDensity(),
                condition.freeSurface(),
                condition.fills(),
                condition.loads().stream().map(LoadEntry::of).toList());
    }
}

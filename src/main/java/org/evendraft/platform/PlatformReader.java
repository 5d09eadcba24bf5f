package org.evendraft.platform;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/** Reads a platform document, checks it as a whole, and prepares what is computed once from it. */
public final class PlatformReader {
    /** Sea water of the usual salinity (t/m³). */
    private static final double DEFAULT_WATER_DENSITY = 1.025;

    private PlatformReader() {}

    /**
     * Reads a platform.
     *
     * @param document the document, as {@link Json#parse} gives it
     * @return the platform, with warnings on what deserves attention
     * @throws FaultyDocumentException with all faults
     */
    public static PreparedPlatform read(JsonNode document) {
        Faults faults = new Faults();
        Platform platform = platform(Fields.of(document, "", faults));
        faults.throwIfAny();
        SpacePlaces.warnings(platform).forEach(faults::warn);
        PreparedPlatform prepared = new PreparedPlatform(platform, faults.warnings());
        checkFloats(prepared);
        return prepared;
    }

    private static void checkFloats(PreparedPlatform prepared) {
        double buoyancy = prepared.platform().waterDensity() * prepared.hull().volume();
        double mass = prepared.platform().lightship().mass();
        if (mass >= buoyancy) {
            throw FaultyDocumentException.impossible(
                    "",
                    String.format(
                            Locale.ROOT,
                            "The platform sinks: its lightship of %.1f t is more than the %.1f t that its whole hull displaces.",
                            mass,
                            buoyancy));
        }
    }

    private static Platform platform(Fields fields) {
        String id = Ids.checked(fields);
        double water = fields.number("waterDensity", Range.DENSITY, DEFAULT_WATER_DENSITY);
        Fields hull = fields.object("hull");
        List<Body> bodies = BodyCheck.read(hull.someObjects("bodies"), hull, "bodies");
        hull.noOthers();
        List<Fields> tankList = fields.objects("tanks");
        List<Tank> tanks = TankReader.read(tankList, water);
        Set<String> tankIds = new LinkedHashSet<>();
        tanks.forEach(tank -> tankIds.add(tank.id()));
        List<Compartment> compartments = CompartmentReader.read(fields.objects("compartments"));
        Platform platform = new Platform(
                id,
                fields.text("name", id),
                water,
                bodies,
                DeckReader.draftMarks(fields.objects("draftMarks")),
                lightship(fields.object("lightship")),
                tanks,
                PumpReader.read(fields.objects("pumps"), tankIds),
                DeckReader.areas(fields.objects("deckAreas")),
                DeckReader.windage(fields.objects("windage")),
                DeckReader.openings(fields.objects("openings")),
                ModeReader.read(fields.objects("modes")),
                compartments,
                RulesReader.read(fields.optionalObject("criteria")),
                DamageCaseReader.read(fields.objects("damageCases"), tanks, compartments));
        fields.noOthers();
        return platform;
    }

    private static Lightship lightship(Fields fields) {
        Lightship lightship = new Lightship(fields.number("mass", Range.POSITIVE), fields.position());
        fields.noOthers();
        return lightship;
    }
}

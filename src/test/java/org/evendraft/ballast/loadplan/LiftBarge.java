package org.evendraft.ballast.loadplan;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import org.evendraft.platform.Json;
import org.evendraft.platform.PlatformReader;
import org.evendraft.platform.PreparedPlatform;

/**
 * A box 60 × 40 × 12 m in fresh water, 8000 t with G at half its depth: it draws 3.333 m, KB = 1.667 m, BM = 40²/(12·3.333) = 40 m. One metre
 * of draft is 2400 t.
 */
final class LiftBarge {
    static final double LIGHTSHIP = 8000;
    static final double AREA = 60 * 40;
    static final double BREADTH = 40;

    private static final String HULL = """
            { "id": "barge", "waterDensity": 1.0,
              "hull": { "bodies": [ { "name": "hull", "shape": "box", "min": [-30, -20, 0], "max": [30, 20, 12] } ] },
              "draftMarks": [ { "id": "P", "x": 0, "y": 20, "zero": 0 } ],
              "lightship": { "mass": 8000, "x": 0, "y": 0, "z": 6 },
              "deckAreas": [ { "id": "deck", "outline": [[-30, -20], [30, -20], [30, 20], [-30, 20]], "z": 12, "maxLoad": 500 } ],
              "windage": [ { "name": "side", "x": 0, "y": 0, "zFrom": 12, "zTo": 20, "areaX": 200, "areaY": 400, "shapeCoefficient": 1.0 } ],
              "modes": [ { "id": "afloat", "maxHeel": 5, "maxTrim": 5, "minGm": { "transverse": 1.0 } } ],
              "tanks": [ TANKS ], "pumps": [ PUMPS ] }
            """;
    private static final String FUEL = """
            { "id": "FUEL", "name": "Fuel", "purpose": "fuel", "density": 0.8,
              "bodies": [ { "name": "FUEL", "shape": "box", "min": [-5, -5, 0], "max": [5, 5, 4] } ], "permeability": 1.0 }
            """;
    private static final String BALLAST = """
            { "id": "ID", "name": "ID", "purpose": "ballast", "density": 1.0,
              "bodies": [ { "name": "ID", "shape": "box", "min": [X, Y, 0], "max": [TOX, TOY, 6] } ],
              "permeability": 1.0, "leastPumpableFraction": 0.01 }
            """;
    private static final String PUMP = """
            { "id": "pump", "rate": 600, "from": ["P1", "P2", "S1", "S2", "sea"], "to": ["P1", "P2", "S1", "S2", "sea"] }
            """;

    private LiftBarge() {}

    /** With a fuel tank alone. */
    static PreparedPlatform bare() {
        return platform(FUEL, "");
    }

    /** With four ballast tanks at the corners too. */
    static PreparedPlatform ballasted() {
        return platform(
                String.join(
                        ",", FUEL, tank("P1", 10, 10), tank("P2", -28, 10), tank("S1", 10, -18), tank("S2", -28, -18)),
                PUMP);
    }

    private static String tank(String id, int fromX, int fromY) {
        return BALLAST.replace("ID", id)
                .replace("TOX", "" + (fromX + 18))
                .replace("TOY", "" + (fromY + 8))
                .replace("X", "" + fromX)
                .replace("Y", "" + fromY);
    }

    private static PreparedPlatform platform(String tanks, String pumps) {
        return PlatformReader.read(json(HULL.replace("TANKS", tanks).replace("PUMPS", pumps)));
    }

    /** A start with the ballast tanks half full. */
    static final String HALF_FULL = """
            "start": { "name": "half", "mode": "afloat", "fills": [ { "tank": "P1", "fraction": 0.5 }, { "tank": "P2", "fraction": 0.5 },
              { "tank": "S1", "fraction": 0.5 }, { "tank": "S2", "fraction": 0.5 } ] }
            """;

    static final String LIGHT = "\"start\": { \"name\": \"light\" }";

    static JsonNode json(String text) {
        return Json.parse(text.getBytes(StandardCharsets.UTF_8));
    }

    static LoadPlanRequest request(PreparedPlatform platform, String rest, String... events) {
        String document = "{ " + rest + ", \"events\": [ " + String.join(", ", events) + " ] }";
        return LoadPlanReader.read(json(document), platform, Optional.empty());
    }

    static LoadPlan plan(PreparedPlatform platform, String rest, String... events) {
        return LoadPlanner.plan(request(platform, rest, events));
    }

    /** The transverse GM of the box loaded to a mass with G at a height (m). */
    static double gm(double mass, double kg) {
        double draft = mass / AREA;
        return draft / 2 + BREADTH * BREADTH / 12 / draft - kg;
    }
}

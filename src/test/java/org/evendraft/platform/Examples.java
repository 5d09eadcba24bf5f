package org.evendraft.platform;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;

/** Documents of a small invented barge that has one of everything. */
public final class Examples {
    private static final String PLATFORM = """
            { "id": "skua", "name": "Skua", "waterDensity": 1.025,
              "hull": { "bodies": [
                { "name": "hull", "shape": "box", "min": [-30, -10, 0], "max": [30, 10, 8] },
                { "name": "column", "shape": "prism", "axis": "z", "from": 8, "to": 20,
                  "outline": [[-5, -5], [5, -5], [5, 5], [-5, 5]], "cornerRadius": 1.5 },
                { "name": "brace", "shape": "cylinder", "start": [5, 0, 14], "end": [25, 0, 14], "diameter": 2, "endDiameter": 1 },
                { "name": "moonpool", "shape": "box", "min": [15, -2, 0], "max": [19, 2, 8], "cutOut": true } ] },
              "draftMarks": [ { "id": "AFT", "x": -30, "y": 0, "zero": 0 } ],
              "lightship": { "mass": 2500, "x": 0.5, "y": 0, "z": 7 },
              "tanks": [
                { "id": "B1", "name": "Ballast 1", "purpose": "ballast", "density": 1.025, "permeability": 0.98,
                  "bodies": [ { "name": "B1", "shape": "box", "min": [-30, -10, 0], "max": [-20, 0, 4] } ],
                  "pressedUpFraction": 0.98, "leastPumpableFraction": 0.01, "greatestFraction": 0.95, "locked": false },
                { "id": "B2", "purpose": "ballast",
                  "bodies": [ { "shape": "box", "min": [-30, 0, 0], "max": [-20, 10, 4] } ] },
                { "id": "F1", "purpose": "fuel", "density": 0.84,
                  "table": [
                    { "level": 0, "volume": 0, "x": 5, "y": 5, "z": 0, "inertiaT": 83.333, "inertiaL": 83.333, "inertiaTL": 0 },
                    { "level": 2, "volume": 200, "x": 5, "y": 5, "z": 1, "inertiaT": 833.33, "inertiaL": 833.33, "inertiaTL": 0 },
                    { "level": 4, "volume": 400, "x": 5, "y": 5, "z": 2, "inertiaT": 833.33, "inertiaL": 833.33 } ] } ],
              "pumps": [ { "id": "P1", "rate": 300, "from": ["B1", "B2", "sea"], "to": ["B1", "B2", "sea"] } ],
              "deckAreas": [ { "id": "aft", "outline": [[-28, -9], [-8, -9], [-8, 9], [-28, 9]], "z": 8, "maxLoad": 400, "maxPressure": 5 } ],
              "windage": [ { "name": "house", "x": 0, "y": 0, "zFrom": 20, "zTo": 26, "areaX": 60, "areaY": 90, "shapeCoefficient": 1 } ],
              "openings": [ { "id": "V1", "x": 4, "y": 4, "z": 20, "closing": "weathertight" } ],
              "modes": [ { "id": "work", "name": "Working", "draftRange": [3, 6], "minGm": { "transverse": 0.5 },
                "allowableKg": [[3, 9], [6, 8]], "maxHeel": 3, "maxTrim": 2, "maxDeckLoad": 500, "windSpeed": 25 } ],
              "compartments": [ { "id": "C1", "permeability": 0.95,
                "bodies": [ { "shape": "box", "min": [0, -10, 0], "max": [10, 0, 8] } ] } ],
              "criteria": { "rules": "moduSurface", "without": ["collision.openingsUnderWater"],
                "own": [ { "name": "intact.leastGm", "clause": "owner's standing orders, 4", "situation": "intact",
                           "measure": "leastGm", "bound": 0.3, "windSpeed": 0 },
                         { "name": "intact.heel", "clause": "owner's standing orders, 5", "situation": "intact",
                           "measure": "inclination", "bound": 15, "limitAngle": "downflooding", "openings": "notWatertight" } ] },
              "damageCases": [ { "id": "bow", "situation": "flooding", "flooded": ["B1", "C1"] },
                               { "id": "side", "flooded": ["B2"] } ] }
            """;

    private static final String CONDITION = """
            { "name": "Working, light", "mode": "work", "waterDensity": 1.02, "freeSurface": "maximum",
              "fills": [ { "tank": "B1", "fraction": 0.5 }, { "tank": "B2", "level": 2, "density": 1.01 },
                         { "tank": "F1", "mass": 84 } ],
              "loads": [ { "name": "reel", "kind": "deck", "area": "aft", "mass": 120, "x": -15, "y": 2, "z": 9.5, "footprint": 30 },
                         { "kind": "suspended", "mass": 20, "x": 10, "y": 12, "z": 30 },
                         { "kind": "line", "mass": 15, "x": 30, "y": 0, "z": 6 },
                         { "kind": "variable", "mass": 5, "x": 0, "y": 0, "z": 21 },
                         { "kind": "correction", "mass": -12, "x": 0, "y": 0, "z": 7 } ] }
            """;

    private Examples() {}

    /** A fresh copy of the platform document. */
    public static ObjectNode platform() {
        return object(PLATFORM);
    }

    /** A fresh copy of the condition document. */
    public static ObjectNode condition() {
        return object(CONDITION);
    }

    /** The platform, read. */
    public static PreparedPlatform prepared() {
        return PlatformReader.read(platform());
    }

    /** Parses an object. */
    public static ObjectNode object(String json) {
        return (ObjectNode) parse(json);
    }

    /** Parses any JSON. */
    public static JsonNode parse(String json) {
        return Json.parse(json.getBytes(StandardCharsets.UTF_8));
    }
}

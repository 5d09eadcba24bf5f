package org.evendraft.http;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import org.evendraft.platform.Json;

/**
 * The {@link Barge} with what its stability is judged by: a wall in the wind, openings, spaces that can be flooded, and criteria. Light
 * it displaces 6000 m³ at 3 m; it is wall-sided to 16.7° of heel, and at 15.6° the scuttle meets the water.
 */
final class ExposedBarge {
    static final String LIGHT = "{ \"mode\": \"afloat\" }";

    /** Area of the wall, seen along y (m²). */
    static final double WALL = 240;

    private static final double KG = 5;
    private static final double DRAFT = 3;
    private static final double MIDDLE = 12;
    private static final double BM = 400 / (12 * DRAFT);
    private static final double MASS = 6000;

    private static final String MORE = """
            { "windage": [ { "name": "wall", "x": 0, "y": 0, "zFrom": 10, "zTo": 14, "areaX": 0, "areaY": 240, "shapeCoefficient": 1 } ],
              "openings": [ { "id": "scuttle", "x": 0, "y": -10, "z": 5.8, "closing": "none" },
                            { "id": "hatch", "x": 0, "y": 0, "z": 10, "closing": "watertight" } ],
              "compartments": [
                { "id": "MID", "bodies": [ { "name": "MID", "shape": "box", "min": [20, -10, 0], "max": [30, 10, 10] } ] },
                { "id": "AFT", "bodies": [ { "name": "AFT", "shape": "box", "min": [-30, -10, 0], "max": [-20, 10, 10] } ] },
                { "id": "PWING", "bodies": [ { "name": "PWING", "shape": "box", "min": [-50, 3.5, 0], "max": [50, 10, 10] } ] },
                { "id": "SWING", "bodies": [ { "name": "SWING", "shape": "box", "min": [-50, -10, 0], "max": [50, -3.5, 10] } ] },
                { "id": "TOP", "bodies": [ { "name": "TOP", "shape": "box", "min": [-50, -10, 2.5], "max": [50, 10, 10] } ] } ],
              "damageCases": [ { "id": "both-ends", "situation": "flooding", "flooded": [ "MID", "AFT" ] } ],
              "criteria": { "rules": "moduColumnStabilized", "without": [ "flooding.range" ], "own": [
                { "name": "heel", "clause": "standing orders", "situation": "intact", "measure": "inclination", "bound": 1 } ] } }
            """;

    private ExposedBarge() {}

    /** Its document. */
    static ObjectNode document() {
        ObjectNode document = (ObjectNode) parse(Barge.PLATFORM);
        document.setAll((ObjectNode) parse(MORE));
        ObjectNode afloat = (ObjectNode) document.at("/modes/0");
        afloat.put("windSpeed", 36);
        document.withArray("modes").addObject().put("id", "calm");
        return document;
    }

    static Api stored(TestService service) {
        Api api = service.api();
        api.put(Barge.PATH, document().toString()).expect(201);
        return api;
    }

    static JsonNode parse(String json) {
        return Json.parse(json.getBytes(StandardCharsets.UTF_8));
    }

    /** Righting arm light: GZ = sin φ·(GM + ½·BM·tan² φ), the wall-sided formula of any textbook (m). */
    static double gz(double phi) {
        return Math.sin(phi) * (gm() + BM / 2 * Math.pow(Math.tan(phi), 2));
    }

    /** Light, transverse (m). */
    static double gm() {
        return DRAFT / 2 + BM - KG;
    }

    /** Area under the righting arms from upright (m·rad): the integral of {@link #gz}. */
    static double area(double phi) {
        return gm() * (1 - Math.cos(phi)) + BM / 2 * (1 / Math.cos(phi) + Math.cos(phi) - 2);
    }

    /** Force on the wall, upright, in the first height band: IMO MODU Code 2009, 3.2.3, with ½·1.222 kg/m³ (kN). */
    static double force(double speed) {
        return 0.611e-3 * speed * speed * WALL;
    }

    /** Wind's heeling arm: force and levers turn with the wall; B is ½·d + ½·BM·tan² φ under the water before they do (m). */
    static double windArm(double speed, double phi) {
        double lever = MIDDLE - DRAFT / 2 + BM / 2 * Math.pow(Math.tan(phi), 2);
        return force(speed) / weight() * lever * Math.pow(Math.cos(phi), 2);
    }

    /** Area under {@link #windArm} from upright (m·rad). */
    static double windArea(double speed, double phi) {
        double even = phi / 2 + Math.sin(2 * phi) / 4;
        double odd = phi / 2 - Math.sin(2 * phi) / 4;
        return force(speed) / weight() * ((MIDDLE - DRAFT / 2) * even + BM / 2 * odd);
    }

    /** kN. */
    static double weight() {
        return MASS * 9.80665;
    }
}

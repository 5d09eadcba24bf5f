package org.evendraft.http;

/** A box of 100 × 20 × 10 m with three tanks, small enough to compute by hand. */
final class Barge {
    static final String ID = "barge";
    static final String PATH = "/api/v1/platforms/barge";

    /** 1 m of draft is 2000 m³, that is 2000 t of fresh water. */
    static final String PLATFORM = """
            { "id": "barge", "name": "Barge", "waterDensity": 1.0,
              "hull": { "bodies": [ { "name": "hull", "shape": "box", "min": [-50, -10, 0], "max": [50, 10, 10] } ] },
              "draftMarks": [ { "id": "F", "x": 50, "y": 0, "zero": 0 }, { "id": "A", "x": -50, "y": 0, "zero": 0 } ],
              "lightship": { "mass": 6000, "x": 0, "y": 0, "z": 5 },
              "tanks": [
                { "id": "PORT", "name": "Port", "purpose": "ballast", "density": 1.0,
                  "bodies": [ { "name": "PORT", "shape": "box", "min": [-20, 5, 0], "max": [20, 10, 5] } ],
                  "permeability": 1.0, "leastPumpableFraction": 0.01 },
                { "id": "STBD", "name": "Starboard", "purpose": "ballast", "density": 1.0,
                  "bodies": [ { "name": "STBD", "shape": "box", "min": [-20, -10, 0], "max": [20, -5, 5] } ],
                  "permeability": 1.0, "leastPumpableFraction": 0.01 },
                { "id": "FUEL", "name": "Fuel", "purpose": "fuel", "density": 0.85,
                  "table": [
                    { "level": 0, "volume": 0, "x": 0, "y": 0, "z": 5, "inertiaT": 100, "inertiaL": 200, "inertiaTL": 0 },
                    { "level": 2, "volume": 100, "x": 0, "y": 0, "z": 6, "inertiaT": 100, "inertiaL": 200, "inertiaTL": 0 } ] } ],
              "pumps": [ { "id": "P1", "rate": 500, "from": ["PORT", "STBD", "sea"], "to": ["PORT", "STBD", "sea"] } ],
              "deckAreas": [ { "id": "deck", "outline": [[-40, -10], [40, -10], [40, 10], [-40, 10]], "z": 10, "maxLoad": 1000 } ],
              "modes": [ { "id": "afloat", "name": "Afloat", "draftRange": [2, 8], "minGm": { "transverse": 1, "longitudinal": 1 },
                           "maxHeel": 5, "maxTrim": 5 } ] }
            """;

    static final String CONDITION = """
            { "name": "Half port", "mode": "afloat", "fills": [ { "tank": "PORT", "fraction": 0.5 } ],
              "loads": [ { "name": "crate", "kind": "deck", "area": "deck", "mass": 100, "x": 0, "y": -5, "z": 11 } ] }
            """;

    static final String PLAN_REQUEST = """
            { "target": { "draft": 3.5, "tolerance": { "draft": 0.05, "angle": 0.1 } } }
            """;

    private Barge() {}

    static Api stored(TestService service) {
        Api api = service.api();
        api.put(PATH, PLATFORM).expect(201);
        return api;
    }
}

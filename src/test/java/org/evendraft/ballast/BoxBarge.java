package org.evendraft.ballast;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.Json;
import org.evendraft.platform.PlatformReader;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Pump;

/** A box 60 m long, 40 m broad and 12 m deep with ballast tanks 6 m high, two rows of them along each side; two pumps. */
final class BoxBarge {
    static final double LENGTH = 60;
    static final double BREADTH = 40;
    private static final double TANK_HEIGHT = 6;

    private final ObjectNode platform = Json.mapper().createObjectNode();
    private final ObjectNode condition = Json.mapper().createObjectNode();
    private final ArrayNode tanks;
    private final ArrayNode pumps;
    private final ArrayNode fills;
    private final ArrayNode loads;

    BoxBarge() {
        platform.put("id", "barge").put("name", "Barge").put("waterDensity", 1.0);
        ObjectNode hull = platform.putObject("hull").putArray("bodies").addObject();
        hull.put("name", "hull").put("shape", "box");
        corner(hull, "min", -LENGTH / 2, -BREADTH / 2, 0);
        corner(hull, "max", LENGTH / 2, BREADTH / 2, 12);
        ArrayNode marks = platform.putArray("draftMarks");
        marks.addObject().put("id", "PF").put("x", 30).put("y", 20).put("zero", 0);
        platform.putObject("lightship")
                .put("mass", 8000)
                .put("x", 0)
                .put("y", 0)
                .put("z", 6);
        tanks = platform.putArray("tanks");
        pumps = platform.putArray("pumps");
        condition.put("name", "test");
        fills = condition.putArray("fills");
        loads = condition.putArray("loads");
    }

    /** Tanks numbered from forward, P and S, each the same length; all half full. */
    static BoxBarge withPairs(int pairs) {
        BoxBarge barge = new BoxBarge();
        double length = LENGTH / pairs;
        for (int i = 0; i < pairs; i++) {
            double to = LENGTH / 2 - i * length;
            barge.tank("P" + (i + 1), to - length, to, 8, 20).fill("P" + (i + 1), 0.5);
            barge.tank("S" + (i + 1), to - length, to, -20, -8).fill("S" + (i + 1), 0.5);
        }
        return barge;
    }

    private static void corner(ObjectNode body, String name, double x, double y, double z) {
        body.putArray(name).add(x).add(y).add(z);
    }

    BoxBarge tank(String id, double fromX, double toX, double fromY, double toY) {
        ObjectNode tank = tanks.addObject();
        tank.put("id", id).put("name", id).put("purpose", "ballast").put("density", 1.0);
        ObjectNode body = tank.putArray("bodies").addObject().put("name", id).put("shape", "box");
        corner(body, "min", fromX, fromY, 0);
        corner(body, "max", toX, toY, TANK_HEIGHT);
        tank.put("pressedUpFraction", 0.98).put("leastPumpableFraction", 0.01);
        return this;
    }

    BoxBarge set(String id, String property, Object value) {
        for (int i = 0; i < tanks.size(); i++) {
            if (tanks.get(i).get("id").asText().equals(id)) {
                ((ObjectNode) tanks.get(i)).putPOJO(property, value);
            }
        }
        return this;
    }

    BoxBarge fill(String id, double fraction) {
        for (int i = fills.size() - 1; i >= 0; i--) {
            if (fills.get(i).get("tank").asText().equals(id)) {
                fills.remove(i);
            }
        }
        fills.addObject().put("tank", id).put("fraction", fraction);
        return this;
    }

    BoxBarge pump(String id, double rate, List<String> ends) {
        return pump(id, rate, ends, ends);
    }

    BoxBarge pump(String id, double rate, List<String> from, List<String> to) {
        ObjectNode pump = pumps.addObject().put("id", id).put("rate", rate);
        from.forEach(pump.putArray("from")::add);
        to.forEach(pump.putArray("to")::add);
        return this;
    }

    /** A pump on each side that reaches all its tanks and the sea. */
    BoxBarge pumpOnEachSide(int pairs, double rate) {
        for (String side : List.of("P", "S")) {
            List<String> ends = new java.util.ArrayList<>(List.of(Pump.SEA));
            for (int i = 1; i <= pairs; i++) {
                ends.add(side + i);
            }
            pump("pump-" + side, rate, ends);
        }
        return this;
    }

    BoxBarge load(double mass, double x, double y, double z) {
        loads.addObject()
                .put("name", "load" + loads.size())
                .put("kind", "variable")
                .put("mass", mass)
                .put("x", x)
                .put("y", y)
                .put("z", z);
        return this;
    }

    /** The tanks of the document in another order. */
    BoxBarge shuffled(long seed) {
        List<com.fasterxml.jackson.databind.JsonNode> all = new java.util.ArrayList<>();
        tanks.forEach(all::add);
        java.util.Collections.shuffle(all, new java.util.Random(seed));
        tanks.removeAll();
        tanks.addAll(all);
        return this;
    }

    PreparedPlatform platform() {
        return PlatformReader.read(reread(platform));
    }

    Condition condition(PreparedPlatform prepared) {
        return ConditionReader.read(reread(condition), prepared);
    }

    private static com.fasterxml.jackson.databind.JsonNode reread(ObjectNode node) {
        return Json.parse(node.toString().getBytes(java.nio.charset.StandardCharsets.UTF_8));
    }

    Plan plan(String request) {
        PreparedPlatform prepared = platform();
        Condition condition = condition(prepared);
        return BallastPlanner.plan(prepared, condition, request(request, prepared, condition));
    }

    static PlanRequest request(String json, PreparedPlatform prepared, Condition condition) {
        return PlanRequestReader.read(
                Json.parse(json.getBytes(java.nio.charset.StandardCharsets.UTF_8)), prepared, condition);
    }
}

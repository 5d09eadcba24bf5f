package org.evendraft.platform;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.evendraft.geometry.Vec3;
import org.junit.jupiter.api.Test;

/** Bodies that overlap, cut-outs outside, tanks out of place; and the published hull that must be let pass. */
class HullCheckTest {

    private static ObjectNode platformOf(String... bodies) {
        return Examples.object("{ \"id\": \"p\", \"hull\": { \"bodies\": [" + String.join(",", bodies)
                + "] }, \"lightship\": { \"mass\": 10, \"x\": 0, \"y\": 0, \"z\": 1 } }");
    }

    private static String box(String name, int x0, int x1, String more) {
        return "{ \"name\": \"%s\", \"shape\": \"box\", \"min\": [%d, 0, 0], \"max\": [%d, 10, 5] %s }"
                .formatted(name, x0, x1, more);
    }

    private static final String CUT_OUT = ", \"cutOut\": true";

    @Test
    void namesBothBodiesThatOverlapAndTheirCommonVolume() {
        List<Fault> faults = PlatformReaderTest.faults(platformOf(box("aft", 0, 10, ""), box("fore", 8, 20, "")));
        assertThat(faults).singleElement().satisfies(fault -> {
            assertThat(fault.pointer()).isEqualTo("/hull/bodies/1");
            assertThat(fault.kind()).isEqualTo(Fault.Kind.MEANING);
            assertThat(fault.detail()).isEqualTo("'aft' and 'fore' overlap: about 100 m³ in common");
        });
    }

    @Test
    void findsTheSameBodyGivenTwice() {
        String brace = "{ \"shape\": \"cylinder\", \"start\": [20, 0, 1], \"end\": [29, 5, 4], \"diameter\": 0.5 }";
        List<Fault> faults = PlatformReaderTest.faults(platformOf(box("hull", 0, 10, ""), brace, brace));
        assertThat(faults).singleElement().extracting(Fault::pointer).isEqualTo("/hull/bodies/2");
    }

    @Test
    void acceptsBodiesThatTouch() {
        PreparedPlatform read = PlatformReader.read(platformOf(box("aft", 0, 10, ""), box("fore", 10, 20, "")));
        assertThat(read.warnings()).isEmpty();
        assertThat(read.hull().volume()).isCloseTo(1000, within(1e-9));
    }

    @Test
    void refusesCutOutsOutsideTheHullAndOnEachOther() {
        List<Fault> faults = PlatformReaderTest.faults(platformOf(
                box("hull", 0, 20, ""),
                box("well", 2, 4, CUT_OUT),
                box("chest", 3, 5, CUT_OUT),
                box("beyond", 19, 21, CUT_OUT)));
        assertThat(faults).extracting(Fault::pointer).containsExactly("/hull/bodies/2", "/hull/bodies/3");
        assertThat(faults.get(1).detail()).contains("'beyond'", "50 %");
    }

    @Test
    void acceptsACutOutThroughTwoBodies() {
        PreparedPlatform read = PlatformReader.read(
                platformOf(box("aft", 0, 10, ""), box("fore", 10, 20, ""), box("moonpool", 8, 12, CUT_OUT)));
        assertThat(read.hull().volume()).isCloseTo(800, within(1e-9));
    }

    @Test
    void warnsOfTanksThatOverlapOrReachOutside() {
        ObjectNode document = Examples.platform();
        PlatformReaderTest.with(document, "/tanks/1/bodies/0/min", Examples.parse("[-30, -1, 0]"));
        PlatformReaderTest.with(document, "/tanks/0/bodies/0/min", Examples.parse("[-30, -12, 0]"));
        List<String> warnings = PlatformReader.read(document).warnings();
        assertThat(warnings).hasSize(2);
        assertThat(warnings.get(0)).contains("B1", "outside", "17 %");
        assertThat(warnings.get(1)).contains("B1 and B2", "40 m³");
    }

    @Test
    void hasNoWarningForTheExample() {
        assertThat(Examples.prepared().warnings()).isEmpty();
    }

    /**
     * OC4-DeepCwind semi-submersible, members as published (Robertson et al., NREL/TP-5000-60601, and the HydroDyn input that goes with
     * it), 20 m higher: its braces meet columns and each other with square ends.
     */
    @Test
    void acceptsThePublishedSemiSubmersibleWithItsBraces() {
        ObjectNode document = platformOf();
        ArrayNode bodies = (ArrayNode) document.at("/hull/bodies");
        cylinder(bodies, "main", new Vec3(0, 0, 0), new Vec3(0, 0, 30), 6.5);
        for (int k = 0; k < 3; k++) {
            double angle = Math.PI / 3 + 2 * Math.PI * k / 3;
            double next = angle + 2 * Math.PI / 3;
            cylinder(bodies, "upper column " + k, at(28.86751, angle, 6), at(28.86751, angle, 32), 12);
            cylinder(bodies, "base column " + k, at(28.86751, angle, 0), at(28.86751, angle, 6), 24);
            cylinder(bodies, "upper delta " + k, between(angle, next, 6, 30), between(next, angle, 6, 30), 1.6);
            cylinder(bodies, "lower delta " + k, between(angle, next, 12, 3), between(next, angle, 12, 3), 1.6);
            cylinder(bodies, "upper Y " + k, at(3.25, angle, 30), at(22.87, angle, 30), 1.6);
            cylinder(bodies, "lower Y " + k, at(3.25, angle, 3), at(16.87, angle, 3), 1.6);
            cylinder(bodies, "cross brace " + k, at(3.25, angle, 3.8), at(22.87, angle, 29.13), 1.6);
        }
        PreparedPlatform read = PlatformReader.read(document);
        assertThat(read.warnings()).isNotEmpty().allMatch(w -> w.contains("cross brace"));
        assertThat(read.hull().parts()).hasSize(22);
    }

    private static Vec3 at(double radius, double angle, double z) {
        return new Vec3(radius * Math.cos(angle), radius * Math.sin(angle), z);
    }

    /** The point a distance from one column's axis towards another's. */
    private static Vec3 between(double from, double to, double distance, double z) {
        Vec3 a = at(28.86751, from, z);
        return a.plus(at(28.86751, to, z).minus(a).unit().times(distance));
    }

    private static void cylinder(ArrayNode bodies, String name, Vec3 start, Vec3 end, double diameter) {
        ObjectNode body =
                bodies.addObject().put("name", name).put("shape", "cylinder").put("diameter", diameter);
        body.putArray("start").add(start.x()).add(start.y()).add(start.z());
        body.putArray("end").add(end.x()).add(end.y()).add(end.z());
    }

    @Test
    void readsTheDemoPlatformWithoutWarning() throws IOException {
        PreparedPlatform demo = PlatformReader.read(Json.parse(Files.readAllBytes(Path.of("db/demo/merganser.json"))));
        assertThat(demo.warnings()).isEmpty();
        assertThat(demo.platform().tanks()).hasSizeGreaterThanOrEqualTo(28);
        Condition condition =
                ConditionReader.read(Json.parse(Files.readAllBytes(Path.of("db/demo/condition.json"))), demo);
        assertThat(condition.fills()).isNotEmpty();
    }
}

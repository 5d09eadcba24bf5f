package org.evendraft.platform;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.evendraft.geometry.Mesh;
import org.evendraft.geometry.MeshDefects;

/** Whatever is done to a document: it reads, or it has faults with pointers; never anything else. */
class AnyDocumentTest {
    private static final PreparedPlatform SKUA = Examples.prepared();
    private static final String[] VALUES = {
        "null",
        "true",
        "\"\"",
        "\"x\"",
        "\"NaN\"",
        "0",
        "-1",
        "1",
        "1e-300",
        "1e300",
        "1e400",
        "-1e9",
        "0.5",
        "9999",
        "[]",
        "{}",
        "[[]]",
        "[0, 0, 0]",
        "[1, 2]",
        "[[0, 0], [1, 0], [0, 1]]",
        "{\"id\": \"a\"}",
        "12345678901234567890123"
    };

    private static void readsOrHasFaults(Runnable reading) {
        try {
            reading.run();
        } catch (FaultyDocumentException e) {
            assertThat(e.faults()).isNotEmpty().allSatisfy(fault -> {
                assertThat(fault.pointer()).matches("(/.*)?");
                assertThat(fault.detail()).isNotBlank();
            });
        }
    }

    private static void gather(JsonNode node, List<JsonNode> parents) {
        if (node.isContainerNode() && !node.isEmpty()) {
            parents.add(node);
        }
        node.forEach(child -> gather(child, parents));
    }

    private static void mutate(JsonNode document, int seed) {
        Random random = new Random(seed);
        List<JsonNode> parents = new ArrayList<>();
        gather(document, parents);
        JsonNode parent = parents.get(random.nextInt(parents.size()));
        int which = random.nextInt(parent.size());
        JsonNode value = Examples.parse(VALUES[random.nextInt(VALUES.length)]);
        boolean remove = random.nextInt(5) == 0;
        if (parent instanceof ArrayNode array) {
            if (remove) {
                array.remove(which);
            } else if (random.nextInt(5) == 0) {
                array.add(array.get(which).deepCopy());
            } else {
                array.set(which, value);
            }
        } else if (parent instanceof ObjectNode object) {
            List<String> names = new ArrayList<>();
            object.fieldNames().forEachRemaining(names::add);
            if (remove) {
                object.remove(names.get(which));
            } else {
                object.set(random.nextInt(10) == 0 ? "new/name~" : names.get(which), value);
            }
        }
    }

    private static ObjectNode platform() {
        ObjectNode document = Examples.platform();
        Mesh tetrahedron = new Mesh(
                new double[] {40, 0, 0, 45, 0, 0, 40, 5, 0, 40, 0, 5}, new int[] {0, 2, 1, 0, 1, 3, 1, 2, 3, 2, 0, 3});
        assertThat(MeshDefects.of(tetrahedron)).isEmpty();
        ((ArrayNode) document.at("/hull/bodies")).add(MeshBodies.toJson(tetrahedron, "fin"));
        return document;
    }

    @Property(tries = 300, seed = "20260612")
    void aPlatformWithOneChange(@ForAll int seed) {
        ObjectNode document = platform();
        mutate(document, seed);
        readsOrHasFaults(() -> PlatformReader.read(document));
    }

    @Property(tries = 300, seed = "20260612")
    void aConditionWithTwoChanges(@ForAll int seed) {
        ObjectNode document = Examples.condition();
        mutate(document, seed);
        mutate(document, ~seed);
        readsOrHasFaults(() -> ConditionReader.read(document, SKUA));
    }

    @Property(tries = 300, seed = "20260612")
    void bytesWithOneChange(@ForAll @IntRange(min = 0, max = 100_000) int at, @ForAll byte value, @ForAll boolean cut) {
        byte[] bytes = platform().toString().getBytes(StandardCharsets.UTF_8);
        int i = at % bytes.length;
        bytes[i] = value;
        byte[] given = cut ? java.util.Arrays.copyOf(bytes, i) : bytes;
        readsOrHasFaults(() -> PlatformReader.read(Json.parse(given)));
    }

    @Property(tries = 500, seed = "20260612")
    void aTableWithOneChange(@ForAll @IntRange(min = 0, max = 100_000) int at, @ForAll byte value) {
        byte[] csv = TankTables.toCsv(SKUA.calibration("F1").table()).getBytes(StandardCharsets.UTF_8);
        csv[at % csv.length] = value;
        readsOrHasFaults(() -> TankTables.fromCsv(csv));
    }
}

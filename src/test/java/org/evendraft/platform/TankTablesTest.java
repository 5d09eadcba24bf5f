package org.evendraft.platform;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class TankTablesTest {
    private static final String HEADER = "level,volume,x,y,z,inertiaT,inertiaL,inertiaTL\r\n";
    private static final String TWO_ROWS = "0,0,1,2,0,10,20,1\r\n2.5,100,1.5,2,1.25,10,20,1\r\n";

    private static List<TableRow> read(String csv) {
        return TankTables.fromCsv(csv.getBytes(StandardCharsets.UTF_8));
    }

    private static List<Fault> faults(String csv) {
        FaultyDocumentException e = catchThrowableOfType(FaultyDocumentException.class, () -> read(csv));
        assertThat(e).as("faults").isNotNull();
        return e.faults();
    }

    @Test
    void readsCsv() {
        assertThat(read(HEADER + TWO_ROWS))
                .containsExactly(
                        new TableRow(0, 0, new Vec3(1, 2, 0), new SecondMoments(10, 20, 1)),
                        new TableRow(2.5, 100, new Vec3(1.5, 2, 1.25), new SecondMoments(10, 20, 1)));
    }

    @Test
    void readsColumnsInAnyOrderQuotedAfterAByteOrderMarkWithoutTheProductAndWithBareLineFeeds() {
        String csv =
                "\uFEFFinertiaL,inertiaT,z,\"y\",x,volume, level\n20,10,0,2,1,0,0\n\n\"20\",10,1.25,2,1.5,1e2,2.5\n";
        assertThat(read(csv))
                .containsExactly(
                        new TableRow(0, 0, new Vec3(1, 2, 0), new SecondMoments(10, 20, 0)),
                        new TableRow(2.5, 100, new Vec3(1.5, 2, 1.25), new SecondMoments(10, 20, 0)));
    }

    @Test
    void writesCsvAndJsonThatReadBackToTheSame() {
        List<TableRow> table = Examples.prepared().calibration("B1").table();
        assertThat(TankTables.toCsv(table)).startsWith(HEADER).endsWith("\r\n");
        assertThat(read(TankTables.toCsv(table))).isEqualTo(table);
        assertThat(TankTables.fromJson(TankTables.toJson(table))).isEqualTo(table);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "4,50,1,2,2,10,20,1 | /2/volume | line 4: volume must rise from row to row: 50 follows 100",
                "2.5,150,1,2,2,10,20,1 | /2/level | line 4: level must rise",
                "4,-1,1,2,2,10,20,1 | /2/volume | line 4: volume must be 0 or more, not -1",
                "4,150,1,2,2,-10,20,1 | /2/inertiaT | line 4: inertiaT must be 0 or more",
                "4,150,1,2,2,10,20,15 | /2/inertiaTL | line 4: inertiaTL cannot be over",
                "4,150,1,2,two,10,20,1 | /2/z | line 4: z must be a finite number, not 'two'",
                "4,NaN,1,2,2,10,20,1 | /2/volume | line 4: volume must be a finite number, not 'NaN'",
                "4,1e400,1,2,2,10,20,1 | /2/volume | finite",
                "4,,1,2,2,10,20,1 | /2/volume | finite",
                "4,150,1 | /2 | line 4: 3 values for 8 columns",
                "4,150,1,2,2,10,20,1,9 | /2 | line 4: 9 values for 8 columns"
            })
    void tellsTheLineAndTheColumnThatIsWrong(String row, String pointer, String words) {
        assertThat(faults(HEADER + TWO_ROWS + row)).singleElement().satisfies(fault -> {
            assertThat(fault.pointer()).isEqualTo(pointer);
            assertThat(fault.detail()).contains(words);
        });
    }

    @Test
    void listsAllThatIsWrong() {
        assertThat(faults(HEADER + "0,x,1,2,0,10,20,1\r\n1,y,1,2,0,10,20,1\r\n"))
                .extracting(Fault::pointer)
                .containsExactly("/0/volume", "/1/volume");
        assertThat(faults(HEADER + TWO_ROWS + "2,-1,1,2,2,10,20,1\r\n5,90,1,2,2,10,20,1\r\n"))
                .extracting(Fault::detail)
                .containsExactlyInAnyOrder(
                        "line 4: volume must be 0 or more, not -1",
                        "line 4: level must rise from row to row: 2 follows 2.5",
                        "line 5: volume must rise from row to row: 90 follows 100");
        assertThat(faults("level,volume,level,depth\r\n"))
                .extracting(Fault::detail)
                .anyMatch(d -> d.contains("'depth'"))
                .anyMatch(d -> d.contains("level is given twice"))
                .anyMatch(d -> d.contains("inertiaT is missing"));
    }

    @ParameterizedTest
    @CsvSource({"'', empty", "'level,volume,x,y,z,inertiaT,inertiaL', at least 2 rows", "'\"level', quotation"})
    void refusesWhatIsNoTable(String csv, String words) {
        assertThat(faults(csv))
                .singleElement()
                .extracting(Fault::detail)
                .asString()
                .contains(words);
    }

    @Test
    void pointsIntoTheJsonAsItWasGiven() {
        FaultyDocumentException list = catchThrowableOfType(
                FaultyDocumentException.class, () -> TankTables.fromJson(Examples.parse("[ { \"level\": \"a\" } ]")));
        assertThat(list.faults()).extracting(Fault::pointer).contains("/0/level", "/0/volume");
        FaultyDocumentException object = catchThrowableOfType(
                FaultyDocumentException.class,
                () -> TankTables.fromJson(Examples.parse("{ \"table\": [], \"a\": 1 }")));
        assertThat(object.faults()).extracting(Fault::pointer).containsExactly("/table", "/a");
        FaultyDocumentException none =
                catchThrowableOfType(FaultyDocumentException.class, () -> TankTables.fromJson(Examples.parse("{}")));
        assertThat(none.faults()).extracting(Fault::pointer).containsExactly("/table");
    }

    @Test
    void replacesTheTableOfOneTankAndLeavesTheOldDocument() {
        ObjectNode old = Examples.platform();
        List<TableRow> table = read(HEADER + TWO_ROWS);
        ObjectNode changed = TankTables.replaced(old, "F1", table);
        assertThat(old).isEqualTo(Examples.platform());
        assertThat(PlatformReader.read(changed).calibration("F1").fullVolume()).isEqualTo(100);
        changed.withArray("tanks").remove(2);
        old.withArray("tanks").remove(2);
        assertThat(changed).isEqualTo(old);
    }
}

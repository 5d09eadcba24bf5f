package org.evendraft.service;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.OptionalInt;
import java.util.stream.IntStream;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Json;
import org.evendraft.platform.TableRow;
import org.evendraft.platform.TankTables;
import org.evendraft.store.StoredPlatform;

/** Reads a tank's calibration table, and replaces it in a new revision of the platform. */
public final class TankTableFile {
    private final PlatformShelf shelf;
    private final StorePlatform storePlatform;

    TankTableFile(PlatformShelf shelf, StorePlatform storePlatform) {
        this.shelf = shelf;
        this.storePlatform = storePlatform;
    }

    /**
     * A tank's calibration table.
     *
     * @param platformRevision the platform's revision
     * @param rows its rows by level
     */
    public record CalibrationTable(int platformRevision, List<TableRow> rows) {

        /** Copies the list. */
        public CalibrationTable {
            rows = List.copyOf(rows);
        }
    }

    /**
     * The table of a tank, given or computed from its shape.
     *
     * @throws Refusal when there is no such platform or tank
     */
    public CalibrationTable read(String platform, String tank) {
        PlatformAtRevision current = shelf.current(platform);
        number(current, tank);
        return new CalibrationTable(
                current.revision(), current.prepared().calibration(tank).table());
    }

    /** The place of a tank in its platform's list. */
    private static int number(PlatformAtRevision platform, String tank) {
        var tanks = platform.prepared().platform().tanks();
        return IntStream.range(0, tanks.size())
                .filter(i -> tanks.get(i).id().equals(tank))
                .findFirst()
                .orElseThrow(() -> Refusal.notFound("Platform " + platform.id() + " has no tank " + tank + "."));
    }

    /**
     * Checks a new table.
     *
     * @param rows the table
     * @param expected the platform's revision that it is for; empty for the current one
     * @throws Refusal when there is no such platform or tank
     * @throws FaultyDocumentException when the platform cannot have that table; pointers start at the table
     */
    public Pending<StorePlatform.StoredRevision> prepare(
            String platform, String tank, List<TableRow> rows, OptionalInt expected) {
        StoredPlatform stored = shelf.stored(platform, OptionalInt.empty());
        int number = number(shelf.at(platform, stored.revision()), tank);
        byte[] text = stored.document().getBytes(StandardCharsets.UTF_8);
        ObjectNode changed = TankTables.replaced(Json.parse(text), tank, rows);
        // The rest of the document is that of the revision read, so that must still be the current one.
        OptionalInt basis = expected.isPresent() ? expected : OptionalInt.of(stored.revision());
        try {
            return storePlatform.prepare(platform, AnswerJson.text(changed), changed, basis);
        } catch (FaultyDocumentException e) {
            throw fromTable(e, "/tanks/" + number + "/table");
        }
    }

    private static FaultyDocumentException fromTable(FaultyDocumentException e, String table) {
        return new FaultyDocumentException(e.faults().stream()
                .map(f -> f.pointer().startsWith(table)
                        ? new Fault(f.pointer().substring(table.length()), f.detail(), f.kind())
                        : f)
                .toList());
    }
}

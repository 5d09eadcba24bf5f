package org.evendraft.http;

import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import org.evendraft.platform.Json;
import org.evendraft.platform.TableRow;
import org.evendraft.platform.TankTables;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.ReadPlatforms;
import org.evendraft.service.TankTableFile;

/** Calibration tables, as JSON or CSV. */
final class TableRoutes {
    static final String TABLE = TankRoutes.TANK + "/table";

    private static final int OK = 200;

    private final TankTableFile tables;
    private final ReadPlatforms platforms;
    private final Writes writes;

    TableRoutes(ControlRoom room, Writes writes) {
        this.tables = room.tankTableFile();
        this.platforms = room.readPlatforms();
        this.writes = writes;
    }

    List<Route> routes() {
        return List.of(
                Route.get(TABLE, this::read).writing(Answer.JSON, CsvText.MEDIA_TYPE),
                Route.put(TABLE, this::replace).reading(Answer.JSON, CsvText.MEDIA_TYPE));
    }

    private Answer read(Request request) {
        new Query(request.query()).done();
        TankTableFile.CalibrationTable table = tables.read(request.variable("platform"), request.variable("tank"));
        Answer answer = request.mediaTypes().answer().equals(CsvText.MEDIA_TYPE)
                ? CsvText.table(table.rows())
                : Answer.json(OK, Map.of("table", TankTables.toJson(table.rows())));
        return answer.with("ETag", Tags.of(table.platformRevision()))
                .with("Platform-Revision", Integer.toString(table.platformRevision()));
    }

    private Answer replace(Request request) {
        new Query(request.query()).done();
        String platform = request.variable("platform");
        String tank = request.variable("tank");
        List<TableRow> rows = request.mediaTypes().body().equals(CsvText.MEDIA_TYPE)
                ? TankTables.fromCsv(request.body())
                : TankTables.fromJson(Json.parse(request.body()));
        return writes.put(() -> {
            OptionalInt expected = Tags.expected(request, platforms, platform);
            return tables.prepare(platform, tank, rows, expected).then(PlatformRoutes::reply);
        });
    }
}

package org.evendraft.http;

import java.util.List;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.HydrostaticPrint;
import org.evendraft.service.HydrostaticRequest;
import org.evendraft.service.HydrostaticTable;
import org.evendraft.service.ReadHydrostatics;

/** Hydrostatics: a row or a table, as JSON, CSV or plain text. */
final class HydrostaticRoutes {
    static final String HYDROSTATICS = PlatformRoutes.PLATFORM + "/hydrostatics";

    private static final String TEXT = "text/plain";
    private static final String TEXT_WITH_CHARSET = TEXT + "; charset=utf-8";

    private final ReadHydrostatics read;

    HydrostaticRoutes(ControlRoom room) {
        this.read = room.readHydrostatics();
    }

    List<Route> routes() {
        return List.of(Route.get(HYDROSTATICS, this::hydrostatics).writing(Answer.JSON, CsvText.MEDIA_TYPE, TEXT));
    }

    private Answer hydrostatics(Request request) {
        Query query = new Query(request.query());
        HydrostaticRequest wanted = HydrostaticRequest.read(query);
        query.done();
        HydrostaticTable table = read.table(request.variable("platform"), wanted);
        return switch (request.mediaTypes().answer()) {
            case CsvText.MEDIA_TYPE -> CsvText.answer(HydrostaticPrint.csv(table.rows(), wanted.digits()));
            case TEXT -> Answer.text(200, TEXT_WITH_CHARSET, HydrostaticPrint.text(table, wanted.digits()));
            default -> Answer.ok(wanted.single() ? ReadHydrostatics.single(table) : table);
        };
    }
}

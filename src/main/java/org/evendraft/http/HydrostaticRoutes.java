package org.evendraft.http;

import java.util.List;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.ReadHydrostatics;
import org.evendraft.stability.HydrostaticRow;
import org.evendraft.stability.Waterplane;

/** Hydrostatics: a row or a table, as JSON or CSV. */
final class HydrostaticRoutes {
    static final String HYDROSTATICS = PlatformRoutes.PLATFORM + "/hydrostatics";

    /** The most rows of a table. */
    private static final int MOST_ROWS = 10_000;

    /** Beyond this the waterplane stands so steep that its section means nothing (degrees). */
    private static final double STEEPEST = 80;

    /** No platform is deeper (m). */
    private static final double DEEPEST = 10_000;

    private final ReadHydrostatics read;

    HydrostaticRoutes(ControlRoom room) {
        this.read = room.readHydrostatics();
    }

    List<Route> routes() {
        return List.of(Route.get(HYDROSTATICS, this::hydrostatics).writing(Answer.JSON, CsvText.MEDIA_TYPE));
    }

    private Answer hydrostatics(Request request) {
        Query query = new Query(request.query());
        String platform = request.variable("platform");
        boolean csv = request.mediaTypes().answer().equals(CsvText.MEDIA_TYPE);
        double heel = angle(query, "heel");
        double trim = angle(query, "trim");
        if (query.hasAny("from", "to", "step")) {
            ReadHydrostatics.Drafts drafts = drafts(query, heel, trim);
            query.done();
            ReadHydrostatics.HydrostaticTable table = read.table(platform, drafts);
            return csv ? CsvText.hydrostatics(table.rows()) : Answer.ok(table);
        }
        double draft = depth(query, "draft");
        query.done();
        HydrostaticRow row = read.row(platform, Waterplane.ofDegrees(draft, heel, trim));
        return csv ? CsvText.hydrostatics(List.of(row)) : Answer.ok(row);
    }

    private static ReadHydrostatics.Drafts drafts(Query query, double heel, double trim) {
        double from = depth(query, "from");
        double to = depth(query, "to");
        double step = query.required("step");
        if (query.sound() && to < from) {
            query.fault("to", "must not be less than from");
        }
        if (query.sound() && step <= 0) {
            query.fault("step", "must be over 0");
        }
        if (query.sound() && (to - from) / step > MOST_ROWS - 1) {
            query.fault("step", "makes more than " + MOST_ROWS + " rows; take a larger one");
        }
        return new ReadHydrostatics.Drafts(from, to, step, heel, trim);
    }

    private static double depth(Query query, String name) {
        double depth = query.required(name);
        if (Math.abs(depth) > DEEPEST) {
            query.fault(name, "must lie within " + (int) DEEPEST + " m");
        }
        return depth;
    }

    private static double angle(Query query, String name) {
        double angle = query.number(name).orElse(0);
        if (Math.abs(angle) > STEEPEST) {
            query.fault(name, "must lie within " + (int) STEEPEST + " degrees");
        }
        return angle;
    }
}

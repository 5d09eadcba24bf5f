package org.evendraft.stability.damage;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.apache.commons.math3.geometry.euclidean.twod.Vector2D;
import org.apache.commons.math3.geometry.euclidean.twod.hull.MonotoneChain;
import org.evendraft.geometry.Chord;
import org.evendraft.geometry.Contour;
import org.evendraft.geometry.HorizontalSection;
import org.evendraft.geometry.PlanLine;
import org.evendraft.platform.Body;

/** The lines that join the centres of the outermost columns, and which side of them the shell lies on. With fewer than three, none. */
final class OutermostColumns {
    /** Lines and points this close to each other touch (m). */
    private static final double TOUCHING = 1e-6;

    /** A body longer in plan than this many times its width is no column; our own bound. */
    private static final double LONGEST_COLUMN = 3;

    private static final int FEWEST_CORNERS = 3;

    private final HorizontalSection between;
    private final double centreX;
    private final double centreY;

    private OutermostColumns(List<Contour> between) {
        this.between = HorizontalSection.ofContours(between);
        double[] centre = between.isEmpty() ? new double[2] : between.get(0).centroid();
        this.centreX = centre[0];
        this.centreY = centre[1];
    }

    /** The columns among bodies of a hull, each at half its height. */
    static OutermostColumns of(List<Body> bodies) {
        List<Vector2D> centres =
                bodies.stream().flatMap(OutermostColumns::centres).toList();
        List<Vector2D> corners = centres.size() < FEWEST_CORNERS
                ? List.of()
                : List.copyOf(new MonotoneChain().findHullVertices(centres));
        return new OutermostColumns(
                corners.size() < FEWEST_CORNERS
                        ? List.of()
                        : List.of(new Contour(corners.stream()
                                .map(c -> new double[] {c.getX(), c.getY()})
                                .toList())));
    }

    private static Stream<Vector2D> centres(Body body) {
        double middle = (body.solid().least().z() + body.solid().greatest().z()) / 2;
        return HorizontalSection.of(body.solid(), middle).contours().stream()
                .filter(contour -> contour.area() > 0 && isColumn(body, contour))
                .map(contour -> new Vector2D(contour.centroid()));
    }

    /** Whether a body is a column where a contour cuts it: taller than the contour is wide, and no wall. */
    static boolean isColumn(Body body, Contour contour) {
        double height = body.solid().greatest().z() - body.solid().least().z();
        return height > contour.lesserWidth() && contour.greaterWidth() <= LONGEST_COLUMN * contour.lesserWidth();
    }

    /** Whether a contour reaches the lines or beyond at one of the places on it: it is on the periphery of the unit. */
    boolean isReachedBy(Contour contour, double step) {
        List<PlanLine> places = new ArrayList<>();
        for (double s = 0; s < contour.perimeter(); s += step) {
            places.add(contour.outward(s));
        }
        return places.stream().anyMatch(place -> isOutboard(place, 0));
    }

    /**
     * Whether a point lies outboard of the lines.
     *
     * @param line a line through it
     * @param at its distance along the line (m)
     */
    boolean isOutboard(PlanLine line, double at) {
        return between.chords(line).stream().noneMatch(c -> c.from() < at - TOUCHING && c.to() > at + TOUCHING);
    }

    /** Whether one looks along a line across the middle of the unit. */
    boolean isInward(PlanLine line) {
        double away = line.dx() * (line.x() - centreX) + line.dy() * (line.y() - centreY);
        return away < 0 && between.chords(line).stream().mapToDouble(Chord::to).anyMatch(to -> to > TOUCHING);
    }
}

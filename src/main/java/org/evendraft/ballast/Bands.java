package org.evendraft.ballast;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.evendraft.ballast.PlanRequest.Target;
import org.evendraft.geometry.Plane;
import org.evendraft.stability.Waterplane;

/** The rows that a target makes: two faces each for draft, heel and trim, and the metacentric heights. */
final class Bands {
    /** Plans aim this part of the tolerance inside the band, so that rounding does not put them outside. */
    private static final double INSIDE = 1e-5;

    private final Plant plant;
    private final Target target;
    private final Stowage reference;
    private final double spareHeight;
    private final List<Coupling> rows = new ArrayList<>();

    private Bands(Plant plant, Target target, Stowage reference) {
        this.plant = plant;
        this.target = target;
        this.reference = reference;
        this.spareHeight = plant.ballastHeight();
    }

    /** Rows that are exact at the faces of the bands: what a target that can be met needs. */
    static List<Coupling> atFaces(Plant plant, Target target, Stowage reference) {
        Bands bands = new Bands(plant, target, reference);
        for (Face face : bands.faces()) {
            bands.addFace(face, bands.planeAt(face));
        }
        bands.addHeights(target.draft());
        return bands.rows;
    }

    /** Rows that are exact near a position: what a target that cannot be met is approached by. */
    static List<Coupling> near(Plant plant, Target target, Stowage reference, Waterplane position) {
        Bands bands = new Bands(plant, target, reference);
        Response response = bands.response(position.plane());
        for (Face face : bands.faces()) {
            bands.addFace(face, response, position.plane());
        }
        bands.addHeights(position);
        return bands.rows;
    }

    /** A face of a band: in metres or as a slope. */
    private record Face(String limit, int component, int sign, double value, double tolerance) {}

    private List<Face> faces() {
        double band = target.tolerance().draft();
        double angle = target.tolerance().angle() * (1 - INSIDE);
        double inside = band * (1 - INSIDE);
        List<Face> faces = new ArrayList<>();
        faces.add(new Face("target.draft", Response.DRAFT, 1, target.draft() + inside, band));
        faces.add(new Face("target.draft", Response.DRAFT, -1, target.draft() - inside, band));
        addSlopes(faces, "target.trimAngle", Response.SLOPE_X, target.trimAngle(), angle);
        addSlopes(faces, "target.heelAngle", Response.SLOPE_Y, -target.heelAngle(), angle);
        return faces;
    }

    private static void addSlopes(List<Face> faces, String limit, int component, double angle, double tolerance) {
        double low = Math.tan(Math.toRadians(angle - tolerance));
        double high = Math.tan(Math.toRadians(angle + tolerance));
        faces.add(new Face(limit, component, 1, high, (high - low) / 2));
        faces.add(new Face(limit, component, -1, low, (high - low) / 2));
    }

    private Plane planeAt(Face face) {
        double[] at = {
            target.draft(), Math.tan(Math.toRadians(target.trimAngle())), -Math.tan(Math.toRadians(target.heelAngle()))
        };
        at[face.component()] = face.value();
        return Plane.ofSlopes(at[Response.DRAFT], at[Response.SLOPE_X], at[Response.SLOPE_Y]);
    }

    private void addFace(Face face, Plane plane) {
        addFace(face, response(plane), plane);
    }

    private void addFace(Face face, Response response, Plane plane) {
        double planeValue = switch (face.component()) {
            case Response.DRAFT -> plane.origin().z();
            case Response.SLOPE_X -> Response.slopeX(plane);
            default -> Response.slopeY(plane);
        };
        rows.add(new PositionRow(
                face.limit(), response, face.component(), face.sign(), face.value(), planeValue, face.tolerance()));
    }

    private Response response(Plane plane) {
        return new Response(plant.prepared(), plant.water().density(), plane, plant.stowage(), reference, spareHeight);
    }

    private void addHeights(double draft) {
        addHeights(Waterplane.ofDegrees(draft, target.heelAngle(), target.trimAngle()));
    }

    /** A height that nothing is asked of must still be positive, for the platform to float upright. */
    private void addHeights(Waterplane position) {
        double displacement = plant.water().density()
                * plant.prepared().hull().below(position.plane()).volume();
        addHeight(displacement, true, target.minGm().transverse());
        addHeight(displacement, false, target.minGm().longitudinal());
    }

    private void addHeight(double displacement, boolean transverse, OptionalDouble bound) {
        rows.add(new MetacentricRow(
                plant.prepared(), plant.water(), plant.stowage(), displacement, transverse, bound.orElse(0)));
    }
}

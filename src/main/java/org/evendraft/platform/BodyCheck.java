package org.evendraft.platform;

import java.util.List;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Overlap;

/**
 * Whether the bodies of a hull, a tank or a compartment make one space: no two of them in one place, cut-outs inside. A little in
 * common, as at the ends of braces that graze a column, is a warning only.
 */
final class BodyCheck {
    /** A space under this counts as none (m³): a cupful. */
    static final double LEAST_VOLUME = 1e-4;

    /** Bodies may have this part of the whole space in common: it stays within the accuracy of hydrostatics. */
    private static final double COMMON_OF_WHOLE = 1e-4;

    /** A body may have this part of itself in common with another: more is no grazing end. */
    private static final double COMMON_OF_BODY = 0.01;

    /** Under this part of the lesser body nothing is said: coordinates are published to the centimetre. */
    private static final double UNNOTICED = 1e-4;

    /** This part of a cut-out may lie outside: more cuts away what is not there. */
    private static final double OUTSIDE = 0.01;

    private final Faults faults;
    private final double whole;
    private final List<BodyReader.Placed> solids;
    private final List<BodyReader.Placed> cutOuts;

    private BodyCheck(List<BodyReader.Placed> placed, double whole, Faults faults) {
        this.faults = faults;
        this.whole = whole;
        this.solids = placed.stream().filter(p -> !p.body().cutOut()).toList();
        this.cutOuts = placed.stream().filter(p -> p.body().cutOut()).toList();
    }

    /**
     * Reads the bodies of a property and checks them together, adding faults and warnings.
     *
     * @param list the objects of the property
     * @param owner the object that has the property
     * @param name the property
     * @return the bodies without faults
     */
    static List<Body> read(List<Fields> list, Fields owner, String name) {
        List<BodyReader.Placed> placed = BodyReader.read(list);
        List<Body> bodies = placed.stream().map(BodyReader.Placed::body).toList();
        if (bodies.isEmpty()) {
            return bodies;
        }
        double volume = PreparedPlatform.assembly(bodies).volume();
        BodyCheck check = new BodyCheck(placed, volume, owner.faults());
        check.pairs(check.solids);
        check.pairs(check.cutOuts);
        if (placed.size() == list.size()) {
            check.insides();
            if (volume < LEAST_VOLUME) {
                owner.meaning(name, "the bodies together have no volume");
            }
        }
        return bodies;
    }

    private void pairs(List<BodyReader.Placed> list) {
        for (int j = 1; j < list.size(); j++) {
            for (int i = 0; i < j; i++) {
                pair(list.get(i).body(), list.get(j));
            }
        }
    }

    private void pair(Body one, BodyReader.Placed placed) {
        Body other = placed.body();
        double common = Overlap.volume(one.solid(), other.solid());
        double lesser = Math.min(one.solid().volume(), other.solid().volume());
        if (common < LEAST_VOLUME || common < UNNOTICED * lesser) {
            return;
        }
        String detail = Words.quote(one.name()) + " and " + Words.quote(other.name()) + " overlap: about "
                + Words.rough(common) + " m³ in common";
        if (common > COMMON_OF_WHOLE * whole || common > COMMON_OF_BODY * lesser) {
            faults.meaning(placed.pointer(), detail);
        } else {
            faults.warn(detail + ", counted twice");
        }
    }

    private void insides() {
        if (solids.isEmpty()) {
            return;
        }
        Assembly around = PreparedPlatform.assembly(
                solids.stream().map(BodyReader.Placed::body).toList());
        for (BodyReader.Placed cutOut : cutOuts) {
            Body body = cutOut.body();
            Assembly alone = new Assembly(List.of(new Assembly.Part(body.solid(), false)));
            double outside = Overlap.partOutside(alone, around);
            if (outside > OUTSIDE) {
                faults.meaning(
                        cutOut.pointer(),
                        "the cut-out " + Words.quote(body.name()) + " must lie inside the other bodies; about "
                                + Words.rough(100 * outside) + " % of it does not");
            }
        }
    }
}

package org.evendraft.platform;

import java.util.List;

/** Whether the bodies of a hull, a tank or a compartment make one space. */
final class BodyCheck {
    /** A space under this counts as none (m³): a cupful. */
    static final double LEAST_VOLUME = 1e-4;

    private BodyCheck() {}

    /**
     * Checks that the bodies have volume together, adding faults.
     *
     * @param name the property that lists them
     * @return the bodies
     */
    static List<Body> whole(List<BodyReader.Placed> placed, Fields fields, String name) {
        List<Body> bodies = placed.stream().map(BodyReader.Placed::body).toList();
        if (!bodies.isEmpty() && PreparedPlatform.assembly(bodies).volume() < LEAST_VOLUME) {
            fields.meaning(name, "the bodies together have no volume");
        }
        return bodies;
    }
}

package org.evendraft.platform;

import java.util.List;

/**
 * The criteria by which a platform's stability is judged.
 *
 * @param rules name of the published rules that they start from
 * @param assumed whether the document names none, so that these were taken for want of better
 * @param criteria the rules' criteria with the platform's own in place of those of the same name, or added
 */
public record StabilityRules(String rules, boolean assumed, List<Criterion> criteria) {

    /** No criteria at all. */
    public static final StabilityRules NONE = new StabilityRules("none", true, List.of());

    /** Copies the list. */
    public StabilityRules {
        criteria = List.copyOf(criteria);
    }

    /** Those of a situation that are judged about axes, one after another: all but the least GM, which is found over all axes at once. */
    public List<Criterion> byAxis(Situation situation) {
        return criteria.stream()
                .filter(c -> c.situation() == situation && c.measure() != Criterion.Measure.LEAST_GM)
                .toList();
    }

    /** Those that ask for a least GM, all of them of the intact platform. */
    public List<Criterion> ofLeastGm() {
        return criteria.stream()
                .filter(c -> c.measure() == Criterion.Measure.LEAST_GM)
                .toList();
    }
}

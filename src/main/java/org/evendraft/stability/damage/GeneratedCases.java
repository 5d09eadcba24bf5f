package org.evendraft.stability.damage;

import java.util.List;
import org.evendraft.platform.DamageCase;

/**
 * Damage cases that follow from a rule.
 *
 * @param cases the cases, each set of spaces once: first what the rule asks for, then the lesser damage
 * @param reasons one sentence for each case in turn: where the damage is, or of which case it is a part
 * @param notes sentences on what the cases leave out or take for granted
 */
public record GeneratedCases(List<DamageCase> cases, List<String> reasons, List<String> notes) {

    /** Copies the lists. */
    public GeneratedCases {
        cases = List.copyOf(cases);
        reasons = List.copyOf(reasons);
        notes = List.copyOf(notes);
    }
}

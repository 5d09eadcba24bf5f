package org.evendraft.stability.damage;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.evendraft.platform.DamageCase;
import org.evendraft.platform.Situation;
import org.evendraft.platform.Space;

/** Gathers damage cases, each set of spaces once, under the name and reason that it had first. */
final class CaseList {
    private static final Comparator<String> BY_NAME =
            String.CASE_INSENSITIVE_ORDER.thenComparing(Comparator.naturalOrder());

    private final Situation situation;
    private final List<Space> spaces;
    private final Map<BitSet, Named> cases = new LinkedHashMap<>();

    private record Named(String place, DamageCase damage, String reason) {}

    /** @param spaces the spaces that the numbers in sets stand for */
    CaseList(Situation situation, List<Space> spaces) {
        this.situation = situation;
        this.spaces = spaces;
    }

    /** Names of a set, in the order of the alphabet. */
    List<String> names(BitSet set) {
        return set.stream().mapToObj(i -> spaces.get(i).id()).sorted(BY_NAME).toList();
    }

    /**
     * Adds a case unless the same spaces are one already.
     *
     * @param place what is damaged; the case's id begins with it
     */
    void add(String place, BitSet set, String reason) {
        cases.computeIfAbsent(set, key -> {
            List<String> names = names(key);
            DamageCase damage = new DamageCase(place + ": " + String.join(" + ", names), situation, names);
            return new Named(place, damage, reason);
        });
    }

    /** Adds lesser damage of every case: each space by itself, each two, and all but one. */
    void addLesser() {
        List.copyOf(cases.entrySet()).forEach(entry -> {
            Named whole = entry.getValue();
            for (BitSet part : parts(entry.getKey())) {
                String reason = "Lesser damage than \"" + whole.damage().id() + "\": only "
                        + String.join(" and ", names(part)) + " open to the sea.";
                add(whole.place(), part, reason);
            }
        });
    }

    private static List<BitSet> parts(BitSet whole) {
        List<BitSet> parts = new ArrayList<>();
        int[] members = whole.stream().toArray();
        for (int out : members) {
            BitSet allButOne = (BitSet) whole.clone();
            allButOne.clear(out);
            parts.add(allButOne);
        }
        for (int i = 0; i < members.length; i++) {
            for (int j = i; j < members.length; j++) {
                BitSet few = new BitSet();
                few.set(members[i]);
                few.set(members[j]);
                parts.add(few);
            }
        }
        parts.removeIf(part -> part.isEmpty() || part.equals(whole));
        return parts;
    }

    /** The cases with their reasons and some notes. */
    GeneratedCases with(List<String> notes) {
        return new GeneratedCases(
                cases.values().stream().map(Named::damage).toList(),
                cases.values().stream().map(Named::reason).toList(),
                notes);
    }
}

package org.evendraft.ballast.loadplan;

/**
 * The instants at which a sequence, or a part of it, is at its worst. Component names are those of the JSON answer.
 *
 * @param heelAngle where the heel to either side is greatest
 * @param trimAngle where the trim to either end is greatest
 * @param gmLeast where the least metacentric height over all axes is least
 */
public record Worst(Instant heelAngle, Instant trimAngle, Instant gmLeast) {

    static Worst of(Instant only) {
        return new Worst(only, only, only);
    }

    /** The worse of two in each respect, the first where they are alike. */
    Worst and(Worst other) {
        return new Worst(
                Math.abs(other.heelAngle.heelAngle()) > Math.abs(heelAngle.heelAngle()) ? other.heelAngle : heelAngle,
                Math.abs(other.trimAngle.trimAngle()) > Math.abs(trimAngle.trimAngle()) ? other.trimAngle : trimAngle,
                other.gmLeast.gmLeast() < gmLeast.gmLeast() ? other.gmLeast : gmLeast);
    }
}

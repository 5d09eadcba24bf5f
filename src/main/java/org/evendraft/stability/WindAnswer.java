package org.evendraft.stability;

import org.evendraft.stability.Equilibrium.Afloat;

/**
 * The wind on a floating platform about one axis. Component names are those of the JSON answer.
 *
 * @param azimuth direction of the axis about which it heels the platform, from x towards y: 0 turns starboard down (degrees)
 * @param resistanceCentre which point moments are about
 * @param afloat its force where the platform floats, draft, heel and trim counted, with the table of contributions
 * @param curve over the inclination about the axis
 */
public record WindAnswer(double azimuth, String resistanceCentre, WindForce afloat, WindCurve curve) {
    private static final String RESISTANCE_CENTRE =
            "lateral resistance centre taken at the height of the centre of buoyancy";

    /**
     * The answer for a loaded platform.
     *
     * @param at where it floats
     * @param speed wind speed (m/s)
     */
    public static WindAnswer of(LoadedPlatform loaded, Afloat at, double speed, RightingCurve.Request request) {
        Inclination held = Inclination.upright(loaded).at(Slopes.of(at.waterplane()));
        HeelPath path = new HeelPath(Math.toRadians(request.azimuth()), request.freeTrim());
        WindForce afloat = new Wind(loaded.prepared().platform().windage()).on(held, path.leeward(held), speed);
        WindCurve curve = AxisAnswer.windCurve(
                loaded,
                RightingArms.fromUpright(loaded, request),
                RightingArms.fromRest(loaded, request.forCriteria(), Slopes.of(at.waterplane())),
                speed);
        return new WindAnswer(request.azimuth(), RESISTANCE_CENTRE, afloat, curve);
    }
}

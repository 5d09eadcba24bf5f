package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Body;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Load;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Tank;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Worked examples of textbooks and courses, each on a box vessel that has the example's KM. "Derrett" is Derrett and Barrass, Ship
 * Stability for Masters and Mates, 5th ed. 1999. Figures are recomputed in full where the source rounds on its way.
 */
class WorkedExamplesTest {
    private static final double SEA = 1.025;

    private final List<Load> loads = new ArrayList<>();
    private final List<Fill> fills = new ArrayList<>();
    private final List<Tank> tanks = new ArrayList<>();

    /** A box of given displacement and draft whose metacentre stands at KM: KM = T/2 + B²/(12T). */
    private static Body vessel(double displacement, double draft, double km) {
        double breadth = Math.sqrt(12 * draft * (km - draft / 2));
        double length = displacement / (SEA * draft * breadth);
        return Floaters.box("hull", -length / 2, length / 2, -breadth / 2, breadth / 2, 0, 4 * draft);
    }

    private void load(Load.Kind kind, double mass, double y, double z) {
        loads.add(new Load(
                "load " + loads.size(), kind, Optional.empty(), mass, new Vec3(0, y, z), OptionalDouble.empty()));
    }

    private void weight(double mass, double y, double z) {
        load(mass < 0 ? Load.Kind.CORRECTION : Load.Kind.VARIABLE, mass, y, z);
    }

    /** A slack box tank on the centreline with its floor at a height, its liquid's density and fraction. */
    private void slackTank(double length, double breadth, double depth, double density, double fraction) {
        tanks.add(Floaters.tank("T", Floaters.box("T", -length / 2, length / 2, -breadth / 2, breadth / 2, 0, depth)));
        fills.add(new Fill("T", length * breadth * depth * fraction, density));
    }

    private ConditionResult evaluate(Body hull, double lightMass, double lightKg) {
        PreparedPlatform platform = Floaters.platform(List.of(hull), lightMass, new Vec3(0, 0, lightKg), tanks);
        return Evaluation.evaluate(platform, Floaters.condition(fills, loads));
    }

    /** Derrett p. 195 ex. 2 (tank half pumped out): 8153.75 t, KG 7.5 m, KM 8.0 m; fluid GM 0.224531 m (printed answer from memory: 0.2246). */
    @Test
    void pumpingOutHalfADoubleBottomTankLosesGmTwice() {
        slackTank(15, 10, 2, SEA, 0.5);
        double light = 8153.75 - 307.5;
        double kg = (8153.75 * 7.5 - 307.5 * 1) / light;
        ConditionResult result = evaluate(vessel(8000, 6, 8.0), light, kg);
        assertThat(result.mass()).isCloseTo(8000, within(1e-9));
        assertThat(result.centreOfGravity().z() - 7.5).isCloseTo(0.115313, within(1e-6));
        assertThat(result.gm().transverse().freeSurfaceCorrection()).isCloseTo(0.160156, within(1e-6));
        assertThat(result.gm().transverse().corrected()).isCloseTo(0.224531, within(1e-6));
    }

    /** Course solutions on free surface (marinegyaan.com, Stability I, chapter 10); the last with KG 9.0 as its solution has it. */
    @ParameterizedTest
    @CsvSource({
        "5000, 242, 0.88, 8, 7, 0.042592, 0.957408",
        "5000, 242, 1.025, 8, 7, 0.049610, 0.950390",
        "6000, 1200, 1.0, 7.4, 6.6, 0.2, 0.6",
        "8800, 1166, 0.95, 10.1, 9.0, 0.125875, 0.974125"
    })
    void freeSurfaceCorrectionIsMomentOverDisplacement(
            double w, double inertia, double density, double km, double kg, double fsc, double fluid) {
        double breadth = 8;
        slackTank(inertia * 12 / 512, breadth, 1, density, 0.5);
        double liquid = inertia * 12 / 512 * breadth * 0.5 * density;
        double light = w - liquid;
        ConditionResult result = evaluate(vessel(w, 5, km), light, (w * kg - liquid * 0.25) / light);
        assertThat(result.gm().transverse().solid()).isCloseTo(km - kg, within(1e-9));
        assertThat(result.gm().transverse().freeSurfaceCorrection()).isCloseTo(fsc, within(1e-6));
        assertThat(result.gm().transverse().corrected()).isCloseTo(fluid, within(1e-6));
    }

    /** Derrett p. 130 ex. 2: box vessel 65 × 12 × 8 m at 4 m, KG 4 m: KB 2, BM 3, KM 5, GM 1 m, 3198 t. */
    @Test
    void boxVesselHasTheTextbooksMetacentricHeight() {
        ConditionResult result =
                Evaluation.evaluate(Floaters.bargeAt(65, 12, 8, 4, 4), Floaters.condition(List.of(), List.of()));
        assertThat(result.mass()).isCloseTo(3198, within(1e-9));
        assertThat(result.evenKeelDraft()).isCloseTo(4, within(1e-10));
        assertThat(result.floating().centreOfBuoyancy().z()).isCloseTo(2, within(1e-10));
        assertThat(result.km().transverse()).isCloseTo(5, within(1e-10));
        assertThat(result.gm().transverse().solid()).isCloseTo(1, within(1e-10));
    }

    /**
     * Derrett p. 130 ex. 1 and 2: righting arms by the wall-sided formula. A centre of gravity off by GZ/cos holds the vessel at the
     * angle: 6000 t, KB 3, KM 6, KG 5.5 m at 25° (GZ 0.349152 m); 3198 t, KM 5, KG 4 m at 5° (281.9242 t·m) and 25° (0.560461 m).
     */
    @ParameterizedTest
    @CsvSource({"6000, 6, 6, 5.5, 25, 0.349152", "3198, 4, 5, 4, 25, 0.560461", "3198, 4, 5, 4, 5, 0.0881564"})
    void wallSidedRightingArmsHoldTheAngle(double w, double draft, double km, double kg, double angle, double gz) {
        double off = gz / Math.cos(Math.toRadians(angle));
        PreparedPlatform platform =
                Floaters.platform(List.of(vessel(w, draft, km)), w, new Vec3(0, -off, kg), List.of());
        ConditionResult result = Evaluation.evaluate(platform, Floaters.condition(List.of(), List.of()));
        assertThat(result.floating().heelAngle()).isCloseTo(angle, within(1e-4));
    }

    /** Derrett 6th ed. ex. 14.4: 1500 t, KB 2.1, KG 2.7, KM 3.1 m, 10 t moved 10 m: 9.46° by GM alone, 9.169° by the wall-sided rule, which is exact here. */
    @Test
    void listAfterATransverseShiftIsTheWallSidedOne() {
        weight(10, -10, 2.7);
        ConditionResult result = evaluate(vessel(1500, 4.2, 3.1), 1490, 2.7);
        assertThat(result.estimate().heelAngle()).isCloseTo(9.4623, within(1e-4));
        assertThat(result.floating().heelAngle()).isCloseTo(9.1690, within(1e-4));
    }

    /** Derrett ex. 14.2: 4515 t, GM 0.4 m, 15 t over 4.2045 m lists 2°. A solved question in feet and tons: 75 × 50, 6000, GM 6: 5.9469°. */
    @ParameterizedTest
    @CsvSource({
        "4515, 0.4, 15, 4.2045, 2.0",
        "6000, 6, 75, 50, 5.9469",
        "8000, 0.426724, 3, 12, 0.60418",
        "4300, 1.79, 6, 13.9945, 0.62503"
    })
    void listByMomentOverDisplacementAndGm(double w, double gm, double mass, double distance, double list) {
        weight(mass, -distance, 10);
        ConditionResult result = evaluate(vessel(w, 5, 10 + gm), w - mass, 10);
        assertThat(result.gm().transverse().corrected()).isCloseTo(gm, within(1e-9));
        assertThat(result.estimate().heelAngle()).isCloseTo(list, within(1e-4));
    }

    /** Derrett pp. 116-117: weights loaded and discharged off the centreline; 8500 t, KG 7.346471, GM 1.353529, G 0.035294 m to starboard. */
    @Test
    void weightsLoadedAndDischargedMoveG() {
        weight(250, -7.6, 6.1);
        weight(300, 6.1, 0.6);
        weight(-50, 4.6, 1.2);
        ConditionResult result = evaluate(vessel(8500, 6, 8.70), 8000, 7.6);
        assertThat(result.mass()).isCloseTo(8500, within(1e-9));
        assertThat(result.centreOfGravity().z()).isCloseTo(7.346471, within(1e-6));
        assertThat(result.centreOfGravity().y()).isCloseTo(-0.035294, within(1e-6));
        assertThat(result.gm().transverse().corrected()).isCloseTo(1.353529, within(1e-6));
        assertThat(result.estimate().heelAngle()).isCloseTo(1.4937, within(1e-4));
    }

    /** Course solutions (marinegyaan.com, chapter 6): 12 000 t, KG 7.6 m; 300 t from Kg 8 m on a derrick head at 20 m, then at Kg 2 m. */
    @ParameterizedTest
    @CsvSource({"SUSPENDED, 20, 7.9", "VARIABLE, 2, 7.45", "VARIABLE, 8, 7.6"})
    void aSuspendedLoadActsAtItsPointOfSuspension(Load.Kind kind, double z, double kg) {
        load(kind, 300, 0, z);
        ConditionResult result = evaluate(vessel(12_000, 7, 9), 11_700, (12_000 * 7.6 - 300 * 8.0) / 11_700);
        assertThat(result.centreOfGravity().z()).isCloseTo(kg, within(1e-9));
    }

    /** College slides on suspended weights: 10 516 t, KG 8.20, KM 9.00; 86 t from Kg 3.40 lifted by a head at 22.00 m: GM 0.647889 m. */
    @Test
    void liftingALoadTakesGm() {
        load(Load.Kind.SUSPENDED, 86, 0, 22);
        double light = 10_516 - 86.0;
        ConditionResult result = evaluate(vessel(10_516, 6, 9), light, (10_516 * 8.2 - 86 * 3.4) / light);
        assertThat(result.gm().transverse().corrected()).isCloseTo(0.647889, within(1e-6));
    }

    /** Derrett p. 96 ex. 2: 5000 t at 4.5, 2000 t at 3.7, 1000 t at 7.5 m; 650 t of deck cargo at 9 m leave GM 0.3 m with KM 5.3 m. */
    @Test
    void deckCargoLeavesTheGmAskedFor() {
        weight(2000, 0, 3.7);
        weight(1000, 0, 7.5);
        weight(650, 0, 9);
        ConditionResult result = evaluate(vessel(8650, 4, 5.3), 5000, 4.5);
        assertThat(result.centreOfGravity().z()).isCloseTo(5, within(1e-9));
        assertThat(result.gm().transverse().corrected()).isCloseTo(0.3, within(1e-9));
    }

    /** Nicholls's Seamanship and Nautical Knowledge p. 517 (feet, tons): KG 21.205, GM 0.795 with KM 22. Course solutions: 6.1 and 5.75 m. */
    @Test
    void kgFromManyParcels() {
        double[][] parcels = {{400, 18}, {1100, 19}, {1250, 21}, {1500, 22}, {900, 23}, {1000, 24}, {600, 25}};
        for (double[] parcel : parcels) {
            weight(parcel[0], 0, parcel[1]);
        }
        ConditionResult result = evaluate(vessel(10_000, 4, 22), 3250, 20);
        assertThat(result.centreOfGravity().z()).isCloseTo(21.205, within(1e-9));
        assertThat(result.gm().transverse().corrected()).isCloseTo(0.795, within(1e-9));
        loads.clear();
        weight(200, 0, 1.7);
        assertThat(evaluate(vessel(9000, 6, 8), 8800, 6.2).centreOfGravity().z())
                .isCloseTo(6.1, within(1e-9));
        loads.clear();
        weight(-600, 0, 11);
        assertThat(evaluate(vessel(12_000, 6, 8), 12_600, 6.0).centreOfGravity().z())
                .isCloseTo(5.75, within(1e-9));
    }

    /** A solved question (sailorsknowit.com, trim): TPC 10, 220 t out: bodily rise 0.22 m. */
    @Test
    void dischargingRaisesTheVesselByItsTonnesPerCentimetre() {
        double breadth = 1000 / SEA / 120;
        Body hull = Floaters.box("hull", -60, 60, -breadth / 2, breadth / 2, 0, 12);
        HydrostaticRow row = row(List.of(hull), 7);
        assertThat(row.tonnesPerCentimetre()).isCloseTo(10, within(1e-9));
        double before = evaluate(hull, 7000, 3).evenKeelDraft();
        weight(-220, 0, 3);
        assertThat(before - evaluate(hull, 7000, 3).evenKeelDraft()).isCloseTo(0.22, within(1e-9));
    }

    /** A solved question (sailorsknowit.com, bilging): box 64 × 10 × 6 m at 5 m; TPC 6.56, BM_L 68.27, MCTC 34.9884; 53.8125 t forward trim 44.60 cm. */
    @Test
    void waterInAnEndCompartmentTrimsTheBox() {
        Body hull = Floaters.box("hull", -32, 32, -5, 5, 0, 6);
        HydrostaticRow row = row(List.of(hull), 5);
        assertThat(row.displacement()).isCloseTo(3280, within(1e-9));
        assertThat(row.tonnesPerCentimetre()).isCloseTo(6.56, within(1e-9));
        assertThat(row.bmL()).isCloseTo(68.2667, within(1e-4));
        double mctc = row.momentToTrimOneDegree() / Math.tan(Math.toRadians(1)) / 64 / 100;
        assertThat(mctc).isCloseTo(34.9867, within(2e-3));
        assertThat(53.8125 * 29 / mctc).isCloseTo(44.6027, within(3e-3));
    }

    /**
     * Bilging by lost buoyancy, the compartment a cut-out (Derrett pp. 206-207, 150 × 24 m at 5 m, 20 m long; a solved question, 40 × 6 m
     * at 2 m, 10 m long): drafts 5.769231 and 2.666667 m, KM 11.204615 and 2.458333 m.
     */
    @ParameterizedTest
    @CsvSource({
        "150, 24, 5, 20, 5.769231, 2.884615, 8.32, 11.204615",
        "40, 6, 2, 10, 2.666667, 1.333333, 1.125, 2.458333"
    })
    void aBilgedCompartmentAmidshipsSinksTheBoxAndCostsBm(
            double length, double breadth, double draft, double bilged, double sunk, double kb, double bm, double km) {
        Body hull = Floaters.box("hull", -length / 2, length / 2, -breadth / 2, breadth / 2, 0, 3 * draft);
        Vec3 corner = new Vec3(bilged / 2, breadth / 2, 3 * draft);
        Body open = new Body("compartment", true, Solid.box(new Vec3(-corner.x(), -corner.y(), 0), corner));
        double mass = SEA * length * breadth * draft;
        EvenKeel evenKeel = LoadedPlatform.of(
                        Floaters.platform(List.of(hull, open), mass, new Vec3(0, 0, 2), List.of()),
                        Floaters.condition(List.of(), List.of()))
                .evenKeel();
        assertThat(evenKeel.draft()).isCloseTo(sunk, within(1e-6));
        assertThat(evenKeel.centreOfBuoyancy().z()).isCloseTo(kb, within(1e-6));
        assertThat(evenKeel.km().transverse()).isCloseTo(km, within(1e-6));
        assertThat(row(List.of(hull, open), sunk).bmT()).isCloseTo(bm, within(1e-5));
    }

    private static HydrostaticRow row(List<Body> bodies, double draft) {
        Assembly hull = new Assembly(bodies.stream()
                .map(b -> new Assembly.Part(b.solid(), b.cutOut()))
                .toList());
        return Hydrostatics.row(hull, SEA, new Waterplane(draft, 0, 0));
    }
}

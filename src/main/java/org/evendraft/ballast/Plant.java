package org.evendraft.ballast;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Fill;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Pump;
import org.evendraft.platform.Purpose;
import org.evendraft.platform.Tank;
import org.evendraft.stability.LoadedPlatform;

/** The platform in its condition with what a plan may move. Immutable. */
final class Plant {
    /** Water of a density within this of the sea's is sea water (t/m³). */
    private static final double SAME_DENSITY = 1e-6;

    private final PreparedPlatform prepared;
    private final Condition condition;
    private final LoadedPlatform loaded;
    private final Stowage stowage;
    private final List<Pump> pumps;
    private final List<BallastTank> tanks;
    private final List<PumpGroup> groups;

    /**
     * @param prepared the platform
     * @param condition the condition that the plan starts from
     * @param request tells which tanks are locked and which pumps are out of service besides
     * @throws FaultyDocumentException when a ballast tank that a plan may move holds something other than the condition's sea water
     */
    Plant(PreparedPlatform prepared, Condition condition, PlanRequest request) {
        this.prepared = prepared;
        this.condition = condition;
        this.loaded = LoadedPlatform.of(prepared, condition);
        this.stowage = Stowage.of(prepared, condition);
        this.pumps = prepared.platform().pumps().stream()
                .filter(pump -> !request.pumpsOutOfService().contains(pump.id()))
                .toList();
        List<Tank> movable = movable(request.lockedTanks());
        checkDensities(movable);
        Map<String, Double> masses = new HashMap<>();
        condition.fills().forEach(fill -> masses.put(fill.tank(), fill.volume() * condition.waterDensity()));
        this.tanks = movable.stream()
                .map(tank -> new BallastTank(
                        tank,
                        prepared.calibration(tank.id()),
                        condition.waterDensity(),
                        masses.getOrDefault(tank.id(), 0.0)))
                .toList();
        Set<String> ends = new HashSet<>(tanks.stream().map(BallastTank::id).toList());
        ends.add(Pump.SEA);
        this.groups = PumpGroup.of(pumps, ends);
    }

    private List<Tank> movable(List<String> lockedTanks) {
        Set<String> onPump = new HashSet<>();
        for (Pump pump : pumps) {
            onPump.addAll(pump.from());
            onPump.addAll(pump.to());
        }
        return prepared.platform().tanks().stream()
                .filter(tank -> tank.purpose() == Purpose.BALLAST && onPump.contains(tank.id()))
                .filter(tank -> !tank.locked() && !lockedTanks.contains(tank.id()))
                .sorted(Comparator.comparing(Tank::id))
                .toList();
    }

    private void checkDensities(List<Tank> movable) {
        Set<String> ids = new HashSet<>(movable.stream().map(Tank::id).toList());
        List<Fault> faults = new ArrayList<>();
        for (int i = 0; i < condition.fills().size(); i++) {
            Fill fill = condition.fills().get(i);
            if (ids.contains(fill.tank())
                    && fill.volume() > 0
                    && Math.abs(fill.density() - condition.waterDensity()) > SAME_DENSITY) {
                faults.add(new Fault(
                        "/fills/" + i + "/density",
                        "ballast tank " + fill.tank() + " holds liquid of " + fill.density()
                                + " t/m³; a plan moves sea water of the condition's " + condition.waterDensity()
                                + " t/m³ only: correct the density or lock the tank",
                        Fault.Kind.MEANING));
            }
        }
        if (!faults.isEmpty()) {
            throw new FaultyDocumentException(faults);
        }
    }

    PreparedPlatform prepared() {
        return prepared;
    }

    Condition condition() {
        return condition;
    }

    LoadedPlatform loaded() {
        return loaded;
    }

    Stowage stowage() {
        return stowage;
    }

    Water water() {
        return new Water(condition.waterDensity(), condition.freeSurface());
    }

    /** The tanks that a plan may move, by name. */
    List<BallastTank> tanks() {
        return tanks;
    }

    /** The pumps in service. */
    List<Pump> pumps() {
        return pumps;
    }

    List<PumpGroup> groups() {
        return groups;
    }

    /** Ballast tanks that are slack and cannot be moved. */
    int slackOthers() {
        Set<String> ids = new HashSet<>(tanks.stream().map(BallastTank::id).toList());
        int count = 0;
        for (Tank tank : prepared.platform().tanks()) {
            if (tank.purpose() == Purpose.BALLAST && !ids.contains(tank.id())) {
                double volume = condition.fills().stream()
                        .filter(fill -> fill.tank().equals(tank.id()))
                        .mapToDouble(Fill::volume)
                        .sum();
                double fraction = volume / prepared.calibration(tank.id()).fullVolume();
                count += BallastTank.countsAsSlack(tank, fraction) ? 1 : 0;
            }
        }
        return count;
    }

    /** The condition with other masses in the tanks, in their order. */
    Condition with(double[] masses) {
        Map<String, Fill> fills = new LinkedHashMap<>();
        condition.fills().forEach(fill -> fills.put(fill.tank(), fill));
        for (int t = 0; t < masses.length; t++) {
            BallastTank tank = tanks.get(t);
            if (masses[t] != tank.start()) {
                fills.put(tank.id(), new Fill(tank.id(), tank.volume(masses[t]), tank.density()));
            }
        }
        return new Condition(
                condition.name(),
                condition.mode(),
                condition.waterDensity(),
                condition.freeSurface(),
                List.copyOf(fills.values()),
                condition.loads());
    }

    /** Height of the middle of all movable tanks, 0 when there are none (m). */
    double ballastHeight() {
        double volume = 0;
        double moment = 0;
        for (BallastTank tank : tanks) {
            double full = tank.calibration().fullVolume();
            volume += full;
            moment += full * tank.calibration().holding(full).centre().z();
        }
        return volume > 0 ? moment / volume : 0;
    }
}

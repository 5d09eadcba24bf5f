package org.evendraft.ballast;

import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.evendraft.platform.Pump;
import org.evendraft.stability.Waterplane;

/**
 * Tells in a sentence what a transfer does by itself: the exact floating position of the start with this transfer alone, less the one of the start.
 * So each sentence can be checked with a pencil from the start's figures, whatever else is pumped at the same time.
 */
final class Explanation {
    /** Changes that round to nothing at two decimals. */
    private static final double NOTHING = 0.005;

    private final Plant plant;
    private final ExactState start;
    private final TankPlaces places;
    private final Map<String, BallastTank> tanks = new HashMap<>();

    Explanation(Plant plant, ExactState start) {
        this.plant = plant;
        this.start = start;
        this.places = new TankPlaces(plant.prepared());
        plant.tanks().forEach(tank -> tanks.put(tank.id(), tank));
    }

    /** The sentence on a transfer. */
    String of(Transfer transfer) {
        String effect = alone(transfer).map(this::change).orElse("it would sink or capsize the platform");
        return what(transfer) + "; by itself " + effect + ".";
    }

    private String what(Transfer transfer) {
        String mass = String.format(Locale.ROOT, "%.1f t", transfer.mass());
        if (transfer.from().equals(Pump.SEA)) {
            return "Takes " + mass + " from the sea into " + named(transfer.to());
        }
        if (transfer.to().equals(Pump.SEA)) {
            return "Pumps " + mass + " from " + named(transfer.from()) + " overboard";
        }
        return "Moves " + mass + " from " + named(transfer.from()) + " to " + named(transfer.to());
    }

    private String named(String id) {
        BallastTank tank = tanks.get(id);
        return tank == null ? id : id + " (" + places.of(tank) + ")";
    }

    /** Where the platform floats with nothing but this done; empty when it would not. */
    private Optional<Waterplane> alone(Transfer transfer) {
        Map<String, Double> volumes = new HashMap<>();
        put(volumes, transfer.from(), -transfer.mass());
        put(volumes, transfer.to(), transfer.mass());
        return ExactState.of(plant.loaded().withVolumes(volumes)).map(ExactState::waterplane);
    }

    private void put(Map<String, Double> volumes, String id, double gained) {
        BallastTank tank = tanks.get(id);
        if (tank != null) {
            volumes.put(id, tank.volume(tank.start() + gained));
        }
    }

    private String change(Waterplane then) {
        Waterplane now = start.waterplane();
        return String.join(
                ", ",
                told(then.heelAngle() - now.heelAngle(), "%.2f° of heel to %s", "starboard", "port", "no heel"),
                told(then.trimAngle() - now.trimAngle(), "%.2f° of trim by the %s", "bow", "stern", "no trim"),
                told(then.draft() - now.draft(), "%.2f m %s draft", "more", "less", "the same draft"));
    }

    private static String told(double change, String form, String positive, String negative, String none) {
        return Math.abs(change) < NOTHING
                ? none
                : String.format(Locale.ROOT, form, Math.abs(change), change > 0 ? positive : negative);
    }
}

package org.evendraft.service;

import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.evendraft.platform.Tank;
import org.evendraft.stability.TankState;
import org.evendraft.store.Database;
import org.evendraft.store.Sounding;
import org.evendraft.store.SoundingRepository;
import org.evendraft.store.StoredSounding;

/** Tells what every tank held when it was read last, and how long ago that was. */
public final class ReadTankStates {
    private static final double SECONDS_IN_MINUTE = 60;

    private final Database database;
    private final PlatformShelf shelf;
    private final SoundingRepository soundings;
    private final Clock clock;

    ReadTankStates(Database database, PlatformShelf shelf, SoundingRepository soundings, Clock clock) {
        this.database = database;
        this.shelf = shelf;
        this.soundings = soundings;
        this.clock = clock;
    }

    /**
     * The tanks of a platform. Component names are those of the JSON.
     *
     * @param platform the platform's id
     * @param platformRevision its revision
     * @param tanks all tanks, in the platform's order
     */
    public record TankStates(String platform, int platformRevision, List<TankStatus> tanks) {

        /** Copies the list. */
        public TankStates {
            tanks = List.copyOf(tanks);
        }
    }

    /**
     * All tanks.
     *
     * @throws Refusal when there is no such platform
     */
    public TankStates all(String platform) {
        PlatformAtRevision current = shelf.current(platform);
        return new TankStates(platform, current.revision(), of(current));
    }

    /**
     * One tank.
     *
     * @throws Refusal when there is no such platform or tank
     */
    public TankStatus one(String platform, String tank) {
        return all(platform).tanks().stream()
                .filter(status -> status.tank().equals(tank))
                .findFirst()
                .orElseThrow(() -> Refusal.notFound("Platform " + platform + " has no tank " + tank + "."));
    }

    List<TankStatus> of(PlatformAtRevision platform) {
        Map<String, StoredSounding> latest =
                database.read(handle -> soundings.latest(handle, platform.id(), platform.revision())).stream()
                        .collect(Collectors.toMap(s -> s.sounding().tank(), Function.identity()));
        return platform.prepared().platform().tanks().stream()
                .map(tank -> status(platform, tank, Optional.ofNullable(latest.get(tank.id()))))
                .toList();
    }

    private TankStatus status(PlatformAtRevision platform, Tank tank, Optional<StoredSounding> latest) {
        return new TankStatus(
                tank.id(),
                tank.name(),
                tank.purpose(),
                platform.prepared().calibration(tank.id()).fullVolume(),
                latest.map(StoredSounding::sounding).map(sounding -> reading(tank, sounding)));
    }

    private TankStatus.Reading reading(Tank tank, Sounding sounding) {
        Sounding.Contents held = sounding.contents();
        Instant at = sounding.takenAt();
        return new TankStatus.Reading(
                held.level(),
                held.volume(),
                held.mass(),
                held.fraction(),
                held.density(),
                TankState.of(held.fraction(), tank.pressedUpFraction()),
                at,
                Math.max(0, Duration.between(at, clock.instant()).toSeconds() / SECONDS_IN_MINUTE),
                sounding.source());
    }
}

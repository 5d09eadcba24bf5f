package org.evendraft.ballast.loadplan;

import java.util.Optional;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Fill;

/**
 * Liquid is taken from a tank or into it.
 *
 * @param word consume or bunker
 * @param end what the tank holds at the end
 */
record TankChange(Word word, Fill end) implements LoadEvent {
    @Override
    public Optional<String> subject() {
        return Optional.of(end.tank());
    }

    @Override
    public Condition at(Condition before, double part) {
        Fill start = Changes.fill(before, end.tank()).orElse(new Fill(end.tank(), 0, end.density()));
        double volume = start.volume() + part * (end.volume() - start.volume());
        double mass = start.mass() + part * (end.mass() - start.mass());
        return Changes.filled(before, part == 1 || volume == 0 ? end : new Fill(end.tank(), volume, mass / volume));
    }

    @Override
    public String doing() {
        return "tank " + end.tank() + (word == Word.CONSUME ? " is being drawn from" : " is being filled");
    }

    @Override
    public String done() {
        return "tank " + end.tank() + (word == Word.CONSUME ? " has been drawn from" : " has been filled");
    }
}

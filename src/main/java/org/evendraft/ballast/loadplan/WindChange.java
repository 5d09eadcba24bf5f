package org.evendraft.ballast.loadplan;

import java.util.Optional;
import org.evendraft.platform.Condition;

/**
 * The wind changes and stays so.
 *
 * @param wind the wind from then on
 */
record WindChange(SteadyWind wind) implements LoadEvent {
    @Override
    public Word word() {
        return Word.WIND;
    }

    @Override
    public Optional<String> subject() {
        return Optional.empty();
    }

    @Override
    public Condition at(Condition before, double part) {
        return before;
    }

    @Override
    public String doing() {
        return wind.words();
    }

    @Override
    public String done() {
        return wind.words();
    }
}

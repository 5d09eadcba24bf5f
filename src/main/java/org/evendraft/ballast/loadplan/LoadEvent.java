package org.evendraft.ballast.loadplan;

import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Load;

/** Something that changes how a platform is loaded, or the wind on it. */
sealed interface LoadEvent
        permits LoadEvent.Aboard,
                LoadEvent.Leaves,
                LoadEvent.Moves,
                LoadEvent.Lift,
                LoadEvent.Slew,
                LoadEvent.SetDown,
                TankChange,
                WindChange {

    /** The word for it in documents. */
    Word word();

    /** The load's name or the tank's id; empty for the wind. */
    Optional<String> subject();

    /**
     * The loading when a part of the event is done.
     *
     * @param before the loading before it
     * @param part over 0 to 1
     */
    Condition at(Condition before, double part);

    /** What is going on while it is being done, in words. */
    String doing();

    /** What is so once it is done, in words. */
    String done();

    /** How events are spelt in documents. */
    enum Word {
        /** A load comes aboard. */
        ABOARD,
        /** A load, or a part of it, leaves. */
        LEAVES,
        /** A load is moved over the deck. */
        MOVES,
        /** The crane takes a load: it acts at the boom tip from then on. */
        LIFT,
        /** The boom tip moves with the load on its hook. */
        SLEW,
        /** A hook load is set down. */
        SET_DOWN,
        /** Liquid is taken from a tank. */
        CONSUME,
        /** Liquid is taken into a tank. */
        BUNKER,
        /** The wind changes. */
        WIND
    }

    /**
     * A load comes aboard where it will be; one of kind suspended hangs there.
     *
     * @param load the load
     */
    record Aboard(Load load) implements LoadEvent {
        @Override
        public Word word() {
            return Word.ABOARD;
        }

        @Override
        public Optional<String> subject() {
            return Optional.of(load.name());
        }

        @Override
        public Condition at(Condition before, double part) {
            return Changes.added(before, part == 1 ? load : Changes.withMass(load, part * load.mass()));
        }

        @Override
        public String doing() {
            return load.name() + " comes aboard";
        }

        @Override
        public String done() {
            return load.name() + " is aboard";
        }
    }

    /**
     * A load leaves.
     *
     * @param load its name
     * @param mass the part of it that leaves (t); all of it when absent
     */
    record Leaves(String load, OptionalDouble mass) implements LoadEvent {
        @Override
        public Word word() {
            return Word.LEAVES;
        }

        @Override
        public Optional<String> subject() {
            return Optional.of(load);
        }

        @Override
        public Condition at(Condition before, double part) {
            return Changes.replaced(before, load, given -> {
                double left = given.mass() - part * mass.orElse(given.mass());
                return left == 0 ? Optional.empty() : Optional.of(Changes.withMass(given, left));
            });
        }

        @Override
        public String doing() {
            return load + " leaves";
        }

        @Override
        public String done() {
            return mass.isPresent() ? "part of " + load + " has left" : load + " has left";
        }
    }

    /**
     * A load is moved straight over the deck.
     *
     * @param load its name
     * @param to where to (m)
     * @param area deck area there, if any
     */
    record Moves(String load, Vec3 to, Optional<String> area) implements LoadEvent {
        @Override
        public Word word() {
            return Word.MOVES;
        }

        @Override
        public Optional<String> subject() {
            return Optional.of(load);
        }

        @Override
        public Condition at(Condition before, double part) {
            return Changes.replaced(
                    before,
                    load,
                    given -> Optional.of(
                            Changes.placed(given, given.kind(), Changes.between(given.position(), to, part), area)));
        }

        @Override
        public String doing() {
            return load + " moves";
        }

        @Override
        public String done() {
            return load + " has moved";
        }
    }

    /**
     * The crane takes a load that stands: its weight passes from there to the boom tip.
     *
     * @param load its name
     * @param boomTip where it acts from then on (m)
     */
    record Lift(String load, Vec3 boomTip) implements LoadEvent {
        @Override
        public Word word() {
            return Word.LIFT;
        }

        @Override
        public Optional<String> subject() {
            return Optional.of(load);
        }

        @Override
        public Condition at(Condition before, double part) {
            return Changes.replaced(
                    before,
                    load,
                    given -> Optional.of(Changes.hanging(given, Changes.between(given.position(), boomTip, part))));
        }

        @Override
        public String doing() {
            return "the crane takes " + load;
        }

        @Override
        public String done() {
            return load + " hangs at the boom tip";
        }
    }

    /**
     * The boom tip moves with a hook load.
     *
     * @param load its name
     * @param boomTip where to (m)
     * @param around the axis about which the crane slews, for a path along an arc; straight when absent
     */
    record Slew(String load, Vec3 boomTip, Optional<Pivot> around) implements LoadEvent {
        @Override
        public Word word() {
            return Word.SLEW;
        }

        @Override
        public Optional<String> subject() {
            return Optional.of(load);
        }

        @Override
        public Condition at(Condition before, double part) {
            return Changes.replaced(before, load, given -> Optional.of(Changes.hanging(given, tip(given, part))));
        }

        private Vec3 tip(Load given, double part) {
            return around.map(pivot -> pivot.between(given.position(), boomTip, part))
                    .orElseGet(() -> Changes.between(given.position(), boomTip, part));
        }

        @Override
        public String doing() {
            return load + " is slewed";
        }

        @Override
        public String done() {
            return load + " has been slewed";
        }
    }

    /**
     * A hook load is set down on a deck: its weight passes from the boom tip to where it stands.
     *
     * @param load its name
     * @param to where to (m)
     * @param area deck area there, if any
     */
    record SetDown(String load, Vec3 to, Optional<String> area) implements LoadEvent {
        @Override
        public Word word() {
            return Word.SET_DOWN;
        }

        @Override
        public Optional<String> subject() {
            return Optional.of(load);
        }

        @Override
        public Condition at(Condition before, double part) {
            return Changes.replaced(before, load, given -> {
                Vec3 acting = Changes.between(given.position(), to, part);
                return Optional.of(
                        part == 1
                                ? Changes.placed(given, Load.Kind.DECK, acting, area)
                                : Changes.hanging(given, acting));
            });
        }

        @Override
        public String doing() {
            return load + " is set down";
        }

        @Override
        public String done() {
            return load + " has been set down";
        }
    }
}

package org.evendraft.geometry;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Gathers where a line enters and leaves weighted contours, and puts together what of it lies inside. */
final class Chords {
    /** Bodies closer to each other than this are taken to touch (m). */
    private static final double TOUCHING = 1e-6;

    /** From this sum of weights a place counts as inside: bodies count 1, cut-outs −1. */
    private static final double INSIDE = 0.5;

    private final List<Crossing> crossings = new ArrayList<>();

    private record Crossing(double at, double step) {}

    /** Adds a place where the sum of weights changes by a step. */
    void add(double at, double step) {
        crossings.add(new Crossing(at, step));
    }

    /** The parts inside, along the line; parts that touch are one, those of no length are left out. */
    List<Chord> inside() {
        crossings.sort(Comparator.comparingDouble(Crossing::at));
        List<Chord> chords = new ArrayList<>();
        double weight = 0;
        double from = 0;
        for (Crossing crossing : crossings) {
            double before = weight;
            weight += crossing.step();
            if (before < INSIDE && weight >= INSIDE) {
                from = crossing.at();
            } else if (before >= INSIDE && weight < INSIDE) {
                append(chords, from, crossing.at());
            }
        }
        return chords;
    }

    private static void append(List<Chord> chords, double from, double to) {
        int last = chords.size() - 1;
        if (last >= 0 && from - chords.get(last).to() <= TOUCHING) {
            chords.set(last, new Chord(chords.get(last).from(), to));
        } else if (to - from > TOUCHING) {
            chords.add(new Chord(from, to));
        }
    }
}

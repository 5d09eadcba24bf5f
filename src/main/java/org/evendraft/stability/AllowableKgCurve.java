package org.evendraft.stability;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.DoubleAdder;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.evendraft.platform.PreparedPlatform;

/** Finds the greatest KG for a list of drafts, and for others between them where a straight line would allow too much. */
public final class AllowableKgCurve {
    /** Between two drafts that were asked for so many times at most a draft is put in the middle. */
    private static final int MOST_HALVINGS = 4;

    private final PreparedPlatform prepared;
    private final KgRequest request;
    private final Progress progress;
    private final DoubleAdder done = new DoubleAdder();
    private final double searches;

    private AllowableKgCurve(PreparedPlatform prepared, KgRequest request, Progress progress) {
        this.prepared = prepared;
        this.request = request;
        this.progress = progress;
        int drafts = request.drafts().size();
        this.searches = request.refineTo().isPresent() ? 2 * drafts - 1 : drafts;
    }

    /**
     * The limits, one for each draft, and for drafts between where the request has them refined.
     *
     * @param request with drafts at which a part of the hull is in the water and a part over it
     * @param progress is told of the work, may stop it
     */
    public static List<KgLimit> find(PreparedPlatform prepared, KgRequest request, Progress progress) {
        return new AllowableKgCurve(prepared, request, progress).find();
    }

    private List<KgLimit> find() {
        List<KgLimit> limits = request.drafts().parallelStream().map(this::at).toList();
        if (request.refineTo().isEmpty()) {
            return limits;
        }
        double refineTo = request.refineTo().getAsDouble();
        List<List<KgLimit>> between = IntStream.range(1, limits.size())
                .parallel()
                .mapToObj(i -> between(limits.get(i - 1), limits.get(i), refineTo, MOST_HALVINGS))
                .toList();
        List<KgLimit> all = new ArrayList<>(limits.subList(0, 1));
        for (int i = 1; i < limits.size(); i++) {
            all.addAll(between.get(i - 1));
            all.add(limits.get(i));
        }
        return all;
    }

    private KgLimit at(double draft) {
        return new KgSearch(prepared, request, draft, share()).find();
    }

    /** Limits at drafts between two others, as many as the line through them needs to keep to the truth. */
    private List<KgLimit> between(KgLimit low, KgLimit high, double refineTo, int halvings) {
        if (halvings == 0 || low.allowableKg() == null || high.allowableKg() == null) {
            return List.of();
        }
        KgLimit middle = at((low.draft() + high.draft()) / 2);
        double chord = (low.allowableKg() + high.allowableKg()) / 2;
        if (middle.allowableKg() != null && chord - middle.allowableKg() <= refineTo) {
            return List.of();
        }
        return Stream.of(
                        between(low, middle, refineTo, halvings - 1),
                        List.of(middle),
                        between(middle, high, refineTo, halvings - 1))
                .flatMap(List::stream)
                .toList();
    }

    /** Tells of one draft's work as a part of that on all; how many drafts will be put between is not known before. */
    private Progress share() {
        double[] before = {0};
        return (fraction, doing) -> {
            done.add((fraction - before[0]) / searches);
            before[0] = fraction;
            synchronized (done) {
                progress.reached(Math.min(1, done.sum()), doing);
            }
        };
    }
}

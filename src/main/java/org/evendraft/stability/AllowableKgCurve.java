package org.evendraft.stability;

import java.util.List;
import java.util.concurrent.atomic.DoubleAdder;
import java.util.stream.IntStream;
import org.evendraft.platform.PreparedPlatform;

/** Finds the greatest KG for a list of drafts. */
public final class AllowableKgCurve {
    private AllowableKgCurve() {}

    /**
     * The limits, one for each draft.
     *
     * @param request with drafts at which a part of the hull is in the water and a part over it
     * @param progress is told of the work, may stop it
     */
    public static List<KgLimit> find(PreparedPlatform prepared, KgRequest request, Progress progress) {
        DoubleAdder done = new DoubleAdder();
        int drafts = request.drafts().size();
        return IntStream.range(0, drafts)
                .parallel()
                .mapToObj(i ->
                        new KgSearch(prepared, request, request.drafts().get(i), share(progress, done, drafts)).find())
                .toList();
    }

    /** Tells of one draft's work as a part of that on all. */
    private static Progress share(Progress progress, DoubleAdder done, int drafts) {
        double[] before = {0};
        return (fraction, doing) -> {
            done.add((fraction - before[0]) / drafts);
            before[0] = fraction;
            synchronized (done) {
                progress.reached(Math.min(1, done.sum()), doing);
            }
        };
    }
}

package org.evendraft.stability;

import java.util.List;
import java.util.OptionalDouble;
import org.evendraft.platform.Mode.KgPoint;

/** The curve of the greatest KG against draft, linear between its points and undefined outside them. */
public final class AllowableKg {
    private AllowableKg() {}

    /**
     * The greatest KG, free surface counted, at a draft (m).
     *
     * @param curve points with drafts rising
     * @param draft even-keel draft (m)
     */
    public static OptionalDouble at(List<KgPoint> curve, double draft) {
        for (int i = 0; i < curve.size(); i++) {
            KgPoint high = curve.get(i);
            if (draft == high.draft()) {
                return OptionalDouble.of(high.kg());
            }
            if (draft < high.draft()) {
                return i == 0 ? OptionalDouble.empty() : OptionalDouble.of(between(curve.get(i - 1), high, draft));
            }
        }
        return OptionalDouble.empty();
    }

    private static double between(KgPoint low, KgPoint high, double draft) {
        double part = (draft - low.draft()) / (high.draft() - low.draft());
        return low.kg() + part * (high.kg() - low.kg());
    }
}

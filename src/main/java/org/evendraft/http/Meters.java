package org.evendraft.http;

import io.micrometer.core.instrument.binder.jvm.ClassLoaderMetrics;
import io.micrometer.core.instrument.binder.jvm.JvmMemoryMetrics;
import io.micrometer.core.instrument.binder.jvm.JvmThreadMetrics;
import io.micrometer.core.instrument.binder.system.ProcessorMetrics;
import io.micrometer.core.instrument.binder.system.UptimeMetrics;
import io.micrometer.prometheusmetrics.PrometheusConfig;
import io.micrometer.prometheusmetrics.PrometheusMeterRegistry;

/** What the service counts and measures of itself. */
final class Meters {
    private Meters() {}

    /** A registry with the usual measures of the Java process. */
    static PrometheusMeterRegistry open() {
        PrometheusMeterRegistry meters = new PrometheusMeterRegistry(PrometheusConfig.DEFAULT);
        new ClassLoaderMetrics().bindTo(meters);
        new JvmMemoryMetrics().bindTo(meters);
        new JvmThreadMetrics().bindTo(meters);
        new ProcessorMetrics().bindTo(meters);
        new UptimeMetrics().bindTo(meters);
        return meters;
    }
}

package org.evendraft;

import ch.qos.logback.classic.LoggerContext;
import ch.qos.logback.classic.joran.JoranConfigurator;
import ch.qos.logback.core.joran.spi.JoranException;
import java.net.URL;
import java.util.Locale;
import org.slf4j.ILoggerFactory;
import org.slf4j.LoggerFactory;

/** Sets log lines up by {@code config/logback.xml} in the program. */
final class Logging {
    private static final String DESCRIPTION = "/config/logback.xml";

    private Logging() {}

    /**
     * Starts or restarts logging.
     *
     * @param format text or json
     * @param level the least level that is logged
     */
    static void start(String format, String level) {
        ILoggerFactory factory = LoggerFactory.getILoggerFactory();
        URL description = Logging.class.getResource(DESCRIPTION);
        // Inside another program, such as Maven, that program's own logging may be in force.
        if (!(factory instanceof LoggerContext context) || description == null) {
            return;
        }
        context.reset();
        context.putProperty("LOG_FORMAT", format);
        context.putProperty("LOG_LEVEL", level.toUpperCase(Locale.ROOT));
        JoranConfigurator configurator = new JoranConfigurator();
        configurator.setContext(context);
        try {
            configurator.doConfigure(description);
        } catch (JoranException e) {
            throw new IllegalStateException("logging cannot be set up", e);
        }
    }
}

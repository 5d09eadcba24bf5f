package org.evendraft;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.dataformat.yaml.YAMLMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.InetAddress;
import java.net.UnknownHostException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;

/**
 * Reads the configuration: the defaults in the program, over them a file, over that the environment. A key or a variable that is not
 * known, and every value that is not allowed, is a fault; all are listed.
 */
final class SettingsReader {
    /** The file that is taken where none is named and it is there. */
    static final Path USUAL_FILE = Path.of("config", "evendraft.yaml");

    /** Variables with this beginning steer tests, not the service. */
    private static final String FOR_TESTS = SettingKey.PREFIX + "TEST_";

    private static final String DEFAULTS = "/config/evendraft.yaml";
    private static final int BYTES_IN_MEGABYTE = 1_000_000;
    private static final int LEAST_TOKEN_LENGTH = 16;

    private final Map<SettingKey, String> values = new EnumMap<>(SettingKey.class);
    private final List<Fault> faults = new ArrayList<>();

    private SettingsReader() {}

    /**
     * Reads it.
     *
     * @param file the file named by whoever starts the program, if any
     * @param environment environment variables
     * @throws FaultyDocumentException with all that is wrong
     */
    static Settings read(Optional<Path> file, Map<String, String> environment) {
        SettingsReader reader = new SettingsReader();
        reader.takeDefaults();
        file.or(() -> Optional.of(USUAL_FILE).filter(Files::isRegularFile)).ifPresent(reader::takeFile);
        reader.takeEnvironment(environment);
        reader.checkAccess();
        if (!reader.faults.isEmpty()) {
            throw new FaultyDocumentException(reader.faults);
        }
        return reader.settings();
    }

    private void takeDefaults() {
        try (InputStream in = SettingsReader.class.getResourceAsStream(DEFAULTS)) {
            if (in == null) {
                throw new IllegalStateException("the program lacks " + DEFAULTS);
            }
            take("", new YAMLMapper().readTree(in));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private void takeFile(Path file) {
        try {
            JsonNode document = new YAMLMapper().readTree(Files.readAllBytes(file));
            if (!document.isMissingNode() && !document.isNull()) {
                take("", document);
            }
        } catch (JsonProcessingException e) {
            fault("", file + " is not YAML: " + e.getOriginalMessage());
        } catch (IOException e) {
            fault("", "the configuration file " + file + " cannot be read");
        }
    }

    private void take(String prefix, JsonNode node) {
        if (!node.isObject()) {
            fault("/" + prefix.replace('.', '/'), "must be a group of keys");
            return;
        }
        for (Map.Entry<String, JsonNode> property : node.properties()) {
            String key = prefix.isEmpty() ? property.getKey() : prefix + "." + property.getKey();
            if (SettingKey.all().anyMatch(k -> k.key().startsWith(key + "."))) {
                take(key, property.getValue());
            } else {
                takeValue(key, property.getValue());
            }
        }
    }

    private void takeValue(String name, JsonNode value) {
        Optional<SettingKey> key =
                SettingKey.all().filter(k -> k.key().equals(name)).findFirst();
        if (key.isEmpty()) {
            fault("/" + name.replace('.', '/'), "unknown key " + name + "; known are " + known());
        } else if (value.isContainerNode() || value.isNull() || key.get().number() != value.isIntegralNumber()) {
            fault(key.get().pointer(), name + " must be " + key.get().allowed());
        } else {
            put(key.get(), value.asText(), name);
        }
    }

    private void takeEnvironment(Map<String, String> environment) {
        Map<String, SettingKey> variables = SettingKey.all().collect(Collectors.toMap(SettingKey::variable, k -> k));
        new TreeMap<>(environment).forEach((name, value) -> {
            SettingKey key = variables.get(name);
            if (key != null) {
                put(key, value, name);
            } else if (name.startsWith(SettingKey.PREFIX) && !name.startsWith(FOR_TESTS)) {
                fault("", "unknown environment variable " + name + "; keys are " + known());
            }
        });
    }

    private void put(SettingKey key, String value, String spelt) {
        if (key.allows(value)) {
            values.put(key, value);
        } else {
            fault(key.pointer(), spelt + " must be " + key.allowed() + ", not \"" + value + "\"");
        }
    }

    private void checkAccess() {
        boolean open = value(SettingKey.ACCESS_MODE).equals("open");
        String host = value(SettingKey.HTTP_HOST);
        if (open && !loopback(host)) {
            fault(
                    SettingKey.ACCESS_MODE.pointer(),
                    "access.mode open is allowed on a loopback host only, and http.host is " + host
                            + ": set access.mode to token and give access.token");
        }
        if (!open && value(SettingKey.ACCESS_TOKEN).length() < LEAST_TOKEN_LENGTH) {
            fault(
                    SettingKey.ACCESS_TOKEN.pointer(),
                    "access.mode token needs an access.token of at least " + LEAST_TOKEN_LENGTH + " characters");
        }
    }

    private static boolean loopback(String host) {
        try {
            return !host.isBlank() && InetAddress.getByName(host).isLoopbackAddress();
        } catch (UnknownHostException e) {
            return false;
        }
    }

    private void fault(String pointer, String detail) {
        faults.add(new Fault(pointer, detail, Fault.Kind.FORM));
    }

    private static String known() {
        return SettingKey.all().map(SettingKey::key).collect(Collectors.joining(", "));
    }

    private String value(SettingKey key) {
        return values.getOrDefault(key, "");
    }

    private int number(SettingKey key) {
        return Integer.parseInt(value(key));
    }

    private Settings settings() {
        return new Settings(
                value(SettingKey.HTTP_HOST),
                number(SettingKey.HTTP_PORT),
                number(SettingKey.HTTP_MAX_BODY_MEGABYTES) * BYTES_IN_MEGABYTE,
                Duration.ofSeconds(number(SettingKey.HTTP_REQUEST_SECONDS)),
                new Settings.DatabaseSettings(
                        value(SettingKey.DATABASE_URL),
                        value(SettingKey.DATABASE_USER),
                        value(SettingKey.DATABASE_PASSWORD)),
                Optional.of(value(SettingKey.ACCESS_TOKEN))
                        .filter(t -> value(SettingKey.ACCESS_MODE).equals("token")),
                value(SettingKey.LOG_FORMAT),
                value(SettingKey.LOG_LEVEL));
    }
}

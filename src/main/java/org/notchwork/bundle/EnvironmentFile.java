package org.notchwork.bundle;

import java.util.List;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonValue;

/** Where and when a study ran: {@code environment.json}, not under the seal. */
public final class EnvironmentFile {

    private static final int LONGEST = 200;

    private EnvironmentFile() {}

    /** Returns the file as JSON. */
    public static JsonObject write(Environment environment) {
        return JsonObject.builder()
                .put("finished", environment.finished())
                .put("format", Formats.ENVIRONMENT)
                .put("java", environment.java())
                .put("program", environment.program())
                .put("seconds", environment.seconds())
                .put("started", environment.started())
                .put("system", environment.system())
                .put("threads", environment.threads())
                .build();
    }

    /** Reads the file; what is returned must not be used if faults were noted. */
    public static Environment read(JsonValue value, List<Fault> faults) {
        Fields fields = Fields.of(value, "", faults);
        Formats.require(fields, Formats.ENVIRONMENT);
        Environment environment = new Environment(
                fields.text("program", 1, LONGEST),
                fields.text("started", 1, LONGEST),
                fields.text("finished", 1, LONGEST),
                fields.integer("seconds", 0, Integer.MAX_VALUE),
                (int) fields.integer("threads", 1, 1 << 16),
                fields.text("java", 1, LONGEST),
                fields.text("system", 1, LONGEST));
        fields.end();
        return environment;
    }
}

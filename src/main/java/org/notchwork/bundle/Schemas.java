package org.notchwork.bundle;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;

/** The JSON Schemas of all files, as one document: {@code schemas.json}. */
public final class Schemas {

    /** The names of the schemas; each is a file {@code NAME.schema.json} beside the program. */
    public static final List<String> NAMES =
            List.of("claims", "control", "cross-checks", "environment", "seal", "study", "summary", "trial");

    private Schemas() {}

    /** Returns one schema. */
    public static JsonObject schema(String name) {
        String resource = "/schemas/" + name + ".schema.json";
        try (InputStream in = Schemas.class.getResourceAsStream(resource)) {
            if (in == null) {
                throw new IllegalStateException("not in the program: " + resource);
            }
            JsonValue value = new JsonReader(JsonLimits.FILE).read(in.readAllBytes());
            return (JsonObject) value;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (JsonFault e) {
            throw new IllegalStateException(resource + ", " + e.place() + ": " + e.getMessage(), e);
        }
    }

    /** Returns the document that holds all schemas, each under its own {@code $id}. */
    public static JsonObject document() {
        JsonObject.Builder all = JsonObject.builder();
        NAMES.forEach(name -> all.put(name, schema(name)));
        return JsonObject.builder()
                .put("$defs", all.build())
                .put("$id", "urn:notchwork:schemas:1")
                .put("$schema", "https://json-schema.org/draft/2020-12/schema")
                .build();
    }
}

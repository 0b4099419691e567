package org.notchwork.verify;

import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.json.JsonObject;
import org.notchwork.json.Printable;

/**
 * One difference, by place and with both values.
 *
 * @param file the file
 * @param line the line, from 1, in a file of lines
 * @param pointer the field: an RFC 6901 pointer, empty for the whole
 * @param written what stands there
 * @param right what should stand there, or was computed
 */
public record Finding(String file, OptionalLong line, String pointer, String written, String right) {

    private static final int SHOWN = 160;
    private static final int POINTER_SHOWN = 200;

    /** Returns a finding about a whole file. */
    public static Finding of(String file, String written, String right) {
        return new Finding(file, OptionalLong.empty(), "", written, right);
    }

    /** Returns one line that is safe to print. */
    public String text() {
        String place = file
                + (line.isPresent() ? ", line " + line.getAsLong() : "")
                + (pointer.isEmpty() ? "" : ", " + Printable.cut(pointer, POINTER_SHOWN));
        return Printable.escape(place + ": found " + shown(written) + ", should be " + shown(right));
    }

    /** Returns the finding as JSON. */
    JsonObject json() {
        JsonObject.Builder json = JsonObject.builder()
                .put("file", Printable.escape(file))
                .put("found", Printable.escape(shown(written)))
                .put("pointer", Printable.escape(Printable.cut(pointer, POINTER_SHOWN)))
                .put("should-be", Printable.escape(shown(right)));
        Optional<Long> number = line.isPresent() ? Optional.of(line.getAsLong()) : Optional.empty();
        number.ifPresent(n -> json.put("line", n));
        return json.build();
    }

    private static String shown(String text) {
        return text.length() <= SHOWN ? text : text.substring(0, SHOWN) + "... (" + text.length() + " characters)";
    }
}

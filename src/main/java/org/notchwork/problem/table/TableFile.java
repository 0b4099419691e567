package org.notchwork.problem.table;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonInteger;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;

/**
 * Reads a table of 2^n rows {@code x,f(x)} in any order, each x once: as comma-separated values, with or without a first
 * line {@code x,f}, or as a JSON array of arrays {@code [x, f(x)]}. All numbers are decimal and not negative.
 */
final class TableFile {

    private static final Pattern ROW = Pattern.compile("\\s*([0-9]{1,9})\\s*,\\s*([0-9]{1,9})\\s*");
    private static final Pattern HEADING = Pattern.compile("\\s*x\\s*,\\s*f\\s*");
    private static final int NOTHING = -1;

    private final int[] values;

    private TableFile(int width) {
        this.values = new int[1 << width];
        Arrays.fill(values, NOTHING);
    }

    /** What is wrong with a file, in one line. */
    static final class Fault extends Exception {

        private static final long serialVersionUID = 1L;

        Fault(String message) {
            super(message);
        }
    }

    /**
     * Reads a file.
     *
     * @param json whether it is JSON
     * @return the value of each of the 2^width points, below 2^width
     */
    static int[] read(byte[] bytes, boolean json, int width) throws Fault {
        TableFile table = new TableFile(width);
        if (json) {
            table.json(bytes);
        } else {
            table.lines(bytes);
        }
        for (int x = 0; x < table.values.length; x++) {
            if (table.values[x] == NOTHING) {
                throw new Fault("no row for x = " + x);
            }
        }
        return table.values;
    }

    private void lines(byte[] bytes) throws Fault {
        List<String> lines = text(bytes).lines().toList();
        for (int i = 0; i < lines.size(); i++) {
            String line = lines.get(i);
            if (line.isBlank() || (i == 0 && HEADING.matcher(line).matches())) {
                continue;
            }
            Matcher row = ROW.matcher(line);
            if (!row.matches()) {
                throw new Fault("line " + (i + 1) + " is not two decimal numbers with a comma between them");
            }
            put(Long.parseLong(row.group(1)), Long.parseLong(row.group(2)), "line " + (i + 1));
        }
    }

    private static String text(byte[] bytes) throws Fault {
        try {
            return StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes))
                    .toString();
        } catch (CharacterCodingException e) {
            throw new Fault("it is not UTF-8");
        }
    }

    private void json(byte[] bytes) throws Fault {
        JsonValue document;
        try {
            document = new JsonReader(JsonLimits.FILE).read(bytes);
        } catch (JsonFault e) {
            throw new Fault(e.place() + ": " + e.getMessage());
        }
        if (!(document instanceof JsonArray rows)) {
            throw new Fault("it is " + document.kind() + ", not an array of rows");
        }
        for (int i = 0; i < rows.items().size(); i++) {
            if (!(rows.items().get(i) instanceof JsonArray row)
                    || row.items().size() != 2
                    || !(row.items().get(0) instanceof JsonInteger x)
                    || !(row.items().get(1) instanceof JsonInteger value)) {
                throw new Fault("row " + i + " is not an array of two whole numbers");
            }
            put(x.value(), value.value(), "row " + i);
        }
    }

    private void put(long x, long value, String where) throws Fault {
        if (x < 0 || x >= values.length) {
            throw new Fault(where + ": x = " + x + " is not in 0 to " + (values.length - 1));
        }
        if (value < 0 || value >= values.length) {
            throw new Fault(where + ": the value " + value + " is not in 0 to " + (values.length - 1));
        }
        if (values[(int) x] != NOTHING) {
            throw new Fault(where + ": a second row for x = " + x);
        }
        values[(int) x] = (int) value;
    }
}

package org.notchwork.json;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;

/**
 * The members of one object, taken out by name and type; every fault is noted and reading goes on.
 *
 * <p>A member that is absent or wrong is noted and answered with a harmless stand-in, so that one pass finds all
 * faults of a document; a caller must not use what it built once {@link #faults} is not empty. Members that nobody
 * asked for are faults as well, noted by {@link #end}. The characters of a string are counted as Unicode code points, as
 * a JSON Schema counts them.
 */
public final class Fields {

    private static final int SHOWN = 60;
    private static final int MOST_UNKNOWN = 20;

    /** Control characters, and the two separators that end a line as well. */
    private static final Pattern SEVERAL_LINES = Pattern.compile("[\\p{Cc}\\u2028\\u2029]");

    private final JsonObject object;
    private final boolean standIn;
    private final String pointer;
    private final List<Fault> faults;
    private final Set<String> known = new TreeSet<>();

    private Fields(Optional<JsonObject> object, String pointer, List<Fault> faults) {
        this.object = object.orElseGet(() -> new JsonObject(Collections.emptyMap()));
        this.standIn = object.isEmpty();
        this.pointer = pointer;
        this.faults = faults;
    }

    /**
     * Opens a value that should be an object; if it is not, that is noted and an empty object stands in, whose members
     * nobody is told to be missing.
     */
    public static Fields of(JsonValue value, String pointer, List<Fault> faults) {
        if (value instanceof JsonObject object) {
            return new Fields(Optional.of(object), pointer, faults);
        }
        faults.add(new Fault(pointer, "this is " + value.kind(), "an object is wanted"));
        return new Fields(Optional.empty(), pointer, faults);
    }

    /** Returns the object itself, whose members need not be asked for one by one. */
    public JsonObject whole() {
        known.addAll(object.members().keySet());
        return object;
    }

    /** Returns where this object stands: an RFC 6901 pointer. */
    public String pointer() {
        return pointer;
    }

    /** Returns the pointer of a member. */
    public String pointer(String name) {
        return Fault.step(pointer, name);
    }

    /** Returns whether this stands in for an object that is missing or something else, which is noted already. */
    public boolean isStandIn() {
        return standIn;
    }

    /** Returns the list that faults are added to, shared by all parts of one document. */
    public List<Fault> faults() {
        return faults;
    }

    /** Returns whether the member is there. */
    public boolean has(String name) {
        known.add(name);
        return object.member(name).isPresent();
    }

    /** Notes a fault of a member. */
    public void fault(String name, String wrong, String mend) {
        faults.add(new Fault(pointer(name), wrong, mend));
    }

    /** Returns a required string of {@code min} to {@code max} characters. */
    public String text(String name, int min, int max) {
        return required(name, "a string").map(v -> text(name, v, min, max)).orElse("");
    }

    /** Returns a required string of {@code min} to {@code max} characters in one line: no control characters. */
    public String line(String name, int min, int max) {
        String text = text(name, min, max);
        if (SEVERAL_LINES.matcher(text).find()) {
            fault(name, "a string with a line break or another control character", "one line is wanted");
            return "";
        }
        return text;
    }

    /** Returns an optional string of {@code min} to {@code max} characters. */
    public Optional<String> optionalText(String name, int min, int max) {
        return optional(name).map(v -> text(name, v, min, max));
    }

    /** Returns a required string of a form. The pattern is this program's own, never one from a document. */
    public String text(String name, Pattern form, String mend) {
        return required(name, "a string").map(v -> text(name, v, form, mend)).orElse("");
    }

    /** Returns an optional string of a form. */
    public Optional<String> optionalText(String name, Pattern form, String mend) {
        return optional(name).map(v -> text(name, v, form, mend));
    }

    /** Returns a required whole number from {@code min} to {@code max}; the smallest stands in after a fault. */
    public long integer(String name, long min, long max) {
        return required(name, "a whole number")
                .map(v -> integer(pointer(name), v, min, max))
                .orElse(min);
    }

    /** Returns an optional whole number from {@code min} to {@code max}. */
    public OptionalLong optionalInteger(String name, long min, long max) {
        Optional<JsonValue> value = optional(name);
        return value.isPresent()
                ? OptionalLong.of(integer(pointer(name), value.get(), min, max))
                : OptionalLong.empty();
    }

    /** Returns an optional truth value. */
    public Optional<Boolean> optionalTruth(String name) {
        return optional(name).map(v -> {
            if (v instanceof JsonBoolean truth) {
                return truth.value();
            }
            faults.add(new Fault(pointer(name), "this is " + v.kind(), "true or false is wanted"));
            return false;
        });
    }

    /** Notes a fault unless a required member has exactly this value. */
    public void require(String name, JsonValue value) {
        required(name, value.kind()).filter(v -> !v.equals(value)).ifPresent(v -> {
            faults.add(new Fault(pointer(name), shown(v), shown(value) + " is wanted"));
        });
    }

    /** Returns a required member that is an object. */
    public Fields object(String name) {
        return required(name, "an object")
                .map(v -> of(v, pointer(name), faults))
                .orElseGet(() -> new Fields(Optional.empty(), pointer(name), faults));
    }

    /** Returns an optional member that is an object. */
    public Optional<Fields> optionalObject(String name) {
        return optional(name).map(v -> of(v, pointer(name), faults));
    }

    /**
     * Returns the items of a required array of {@code min} to {@code max} items, each with its own pointer; of a longer
     * array the first {@code max}.
     */
    public List<Item> items(String name, int min, int max) {
        return required(name, "an array").map(v -> items(name, v, min, max)).orElse(List.of());
    }

    /** Returns the items of an optional array of {@code min} to {@code max} items. */
    public Optional<List<Item>> optionalItems(String name, int min, int max) {
        return optional(name).map(v -> items(name, v, min, max));
    }

    /**
     * Notes every member that nobody asked for, with the nearest known name where one is near.
     *
     * <p>The first 20 are noted one by one and the others by their number, so that a hostile file cannot make a
     * message longer than itself.
     */
    public void end() {
        List<String> unknown = object.members().keySet().stream()
                .filter(name -> !known.contains(name))
                .toList();
        for (String name : unknown.subList(0, Math.min(unknown.size(), MOST_UNKNOWN))) {
            faults.add(new Fault(pointer(name), "unknown member " + quoted(name), Spelling.mend(name, known)));
        }
        int more = unknown.size() - MOST_UNKNOWN;
        if (more > 0) {
            String members = more == 1 ? " more unknown member" : " more unknown members";
            faults.add(new Fault(pointer, more + members, "known here: " + String.join(", ", known)));
        }
    }

    /** Returns a text as a message shows it: quoted, cut to a readable length. */
    public static String quoted(String text) {
        return CanonicalJson.text(new JsonText(Printable.cut(text, SHOWN)));
    }

    private static String shown(JsonValue value) {
        return Printable.cut(CanonicalJson.text(value), SHOWN);
    }

    private Optional<JsonValue> optional(String name) {
        known.add(name);
        return object.member(name);
    }

    private Optional<JsonValue> required(String name, String wanted) {
        Optional<JsonValue> value = optional(name);
        if (value.isEmpty() && !standIn) {
            faults.add(new Fault(pointer(name), "this member is missing", wanted + " is wanted"));
        }
        return value;
    }

    private String text(String name, JsonValue value, int min, int max) {
        String wrong = "this is " + value.kind();
        if (value instanceof JsonText text) {
            int length = text.value().codePointCount(0, text.value().length());
            if (length >= min && length <= max) {
                return text.value();
            }
            wrong = "a string of " + length + (length == 1 ? " character" : " characters");
        }
        faults.add(new Fault(pointer(name), wrong, "a string of " + min + " to " + max + " characters is wanted"));
        return "";
    }

    private String text(String name, JsonValue value, Pattern form, String mend) {
        if (value instanceof JsonText text && form.matcher(text.value()).matches()) {
            return text.value();
        }
        String wrong = value instanceof JsonText text ? quoted(text.value()) : "this is " + value.kind();
        faults.add(new Fault(pointer(name), wrong, mend));
        return "";
    }

    private long integer(String at, JsonValue value, long min, long max) {
        if (value instanceof JsonInteger number && number.value() >= min && number.value() <= max) {
            return number.value();
        }
        String wrong = value instanceof JsonInteger number ? Long.toString(number.value()) : "this is " + value.kind();
        faults.add(new Fault(at, wrong, "a whole number from " + min + " to " + max + " is wanted"));
        return min;
    }

    private List<Item> items(String name, JsonValue value, int min, int max) {
        if (!(value instanceof JsonArray array)) {
            faults.add(new Fault(pointer(name), "this is " + value.kind(), "an array is wanted"));
            return List.of();
        }
        int size = array.items().size();
        if (size < min || size > max) {
            String wrong = size == 0 ? "an empty list" : "a list of " + size;
            String range = min == max ? Integer.toString(min) : min + " to " + max;
            faults.add(new Fault(pointer(name), wrong, range + " items are wanted"));
        }
        List<Item> items = new ArrayList<>();
        for (int i = 0; i < Math.min(size, max); i++) {
            items.add(new Item(array.items().get(i), Fault.step(pointer(name), Integer.toString(i))));
        }
        return List.copyOf(items);
    }

    /** One item of an array, with where it stands. */
    public final class Item {

        private final JsonValue value;
        private final String at;

        private Item(JsonValue value, String at) {
            this.value = value;
            this.at = at;
        }

        /** Returns the item as it is. */
        public JsonValue value() {
            return value;
        }

        /** Returns where the item stands: an RFC 6901 pointer. */
        public String pointer() {
            return at;
        }

        /** Notes a fault of the item. */
        public void fault(String wrong, String mend) {
            faults.add(new Fault(at, wrong, mend));
        }

        /** Returns the item as an object. */
        public Fields object() {
            return of(value, at, faults);
        }

        /** Returns the item as a whole number from {@code min} to {@code max}. */
        public long integer(long min, long max) {
            return Fields.this.integer(at, value, min, max);
        }

        /** Returns the item as a string of a form. */
        public String text(Pattern form, String mend) {
            if (value instanceof JsonText text && form.matcher(text.value()).matches()) {
                return text.value();
            }
            String wrong = value instanceof JsonText text ? quoted(text.value()) : "this is " + value.kind();
            faults.add(new Fault(at, wrong, mend));
            return "";
        }
    }
}

package org.notchwork.problem.table;

import java.util.List;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Attachment;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.seed.RandomStream;

/** A function that the author gives as a file; every trial faces the same one. Immutable. */
final class GivenTable implements Problem {

    private final Attachment file;
    private final int width;
    private final int[] values;
    private final Declared declared;
    private final PromiseSearch.Found found;
    private final String digest;

    GivenTable(Attachment file, int width, int[] values, Declared declared, PromiseSearch.Found found, String digest) {
        this.file = file;
        this.width = width;
        this.values = values;
        this.declared = declared;
        this.found = found;
        this.digest = digest;
    }

    @Override
    public String kind() {
        return TableFamily.KIND;
    }

    @Override
    public JsonObject settings() {
        JsonObject.Builder json = JsonObject.builder()
                .put("file", file.name())
                .put("kind", kind())
                .put("promise", declared.kind().word())
                .put("sha256", digest)
                .put("width", width);
        if (declared.kind() == Declared.Kind.HIDDEN_SUBSPACE) {
            json.put("dimension", declared.dimension());
        }
        if (found.broken().isPresent()) {
            json.put("promise-not-kept", true);
        }
        return json.build();
    }

    @Override
    public String description() {
        return "table: the function in the file " + file.name() + ", declared as "
                + declared.kind().word()
                + found.broken().map(b -> "; PROMISE NOT KEPT: " + b).orElse(", which holds on the whole domain");
    }

    @Override
    public Promise promise() {
        return declared.promise();
    }

    /** Returns whether the function breaks its promise, which the study then states. */
    @Override
    public boolean isPromiseBroken() {
        return found.broken().isPresent();
    }

    @Override
    public List<Attachment> attachments() {
        return List.of(file);
    }

    @Override
    public int leastWidth() {
        return width;
    }

    @Override
    public int greatestWidth() {
        return width;
    }

    @Override
    public long memoryBytes(int ofWidth) {
        return 8L << ofWidth;
    }

    @Override
    public Instance draw(int ofWidth, RandomStream stream) {
        if (ofWidth != width) {
            throw new IllegalArgumentException("width " + ofWidth + " of a table of width " + width);
        }
        return new Instance(new Values(width, declared.isBoolean() ? 1 : width, values), found.hidden());
    }

    @Override
    public Instance drawHiding(Answer hidden, int ofWidth, RandomStream stream) {
        if (!hidden.equals(found.hidden())) {
            throw new IllegalArgumentException("the table hides something else than " + hidden);
        }
        return draw(ofWidth, stream);
    }

    /** Nothing is listed: the table hides one thing. */
    @Override
    public List<Answer> answers(int ofWidth) {
        return List.of();
    }

    private static final class Values implements BitFunction {

        private final int width;
        private final int valueWidth;
        private final int[] values;

        Values(int width, int valueWidth, int[] values) {
            this.width = width;
            this.valueWidth = valueWidth;
            this.values = values;
        }

        @Override
        public int width() {
            return width;
        }

        @Override
        public int valueWidth() {
            return valueWidth;
        }

        @Override
        public long at(long x) {
            return values[(int) x];
        }
    }
}

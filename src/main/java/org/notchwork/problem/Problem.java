package org.notchwork.problem;

import java.util.List;
import org.notchwork.json.JsonObject;
import org.notchwork.seed.RandomStream;

/** A family of functions with a promise and a question, with its settings fixed. Immutable. */
public interface Problem {

    /** Returns the kind, as a study file names it. */
    String kind();

    /** Returns the settings as the study file writes them, with the kind, defaults filled in. */
    JsonObject settings();

    /** Returns the promise and the question in one sentence, for people. */
    String description();

    /** Returns what everybody is told about every function of this problem. */
    Promise promise();

    /**
     * Returns the names of the functions that can be called on their own, in the order of their counters; empty if there
     * is but the one function.
     */
    default List<String> functions() {
        return List.of();
    }

    /** Returns the files that the problem was made from; they go into the bundle. */
    default List<Attachment> attachments() {
        return List.of();
    }

    /** Returns whether its functions break the promise, and are run all the same because the study says so. */
    default boolean isPromiseBroken() {
        return false;
    }

    /** Returns the smallest width that this family has. */
    int leastWidth();

    /** Returns the largest width that can be drawn with these settings. */
    int greatestWidth();

    /** Returns about how many bytes one instance of a width takes. */
    long memoryBytes(int width);

    /**
     * Draws an instance: what is hidden first, then the function.
     *
     * @param width the number of input bits, within the bounds
     * @param stream the stream of the trial's instance
     */
    Instance draw(int width, RandomStream stream);

    /** Draws an instance that hides a given answer: the function is drawn, what is hidden is not. */
    Instance drawHiding(Answer hidden, int width, RandomStream stream);

    /**
     * Returns everything an instance of this width can hide, each equally likely, for exhaustive checks at widths of at
     * most 12; empty where there is no such list.
     */
    List<Answer> answers(int width);

    /**
     * Returns whether there is something for a control to face: not where one of two answers is always right, and not at
     * widths where no table fits.
     */
    default boolean hasControl(int width) {
        return width <= RandomFunction.GREATEST_WIDTH && promise().question() != Question.CONSTANT_OR_BALANCED;
    }

    /**
     * Draws an instance of this width that hides nothing: what a control faces. A random function of n bits without a
     * period, or of one bit for an inner product, unless the problem has something nearer.
     *
     * @param width the number of input bits, within the bounds
     * @param stream the stream of the trial's control
     */
    default Instance control(int width, RandomStream stream) {
        RandomFunction drawn = promise().question() == Question.MASK
                ? RandomFunction.draw(width, 1, stream)
                : RandomFunction.withoutPeriod(width, stream);
        return new Instance(drawn, new Answer.NoPeriod());
    }
}

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

    /** Returns everything an instance of this width can hide, for exhaustive checks; widths of at most 12. */
    List<Answer> answers(int width);
}

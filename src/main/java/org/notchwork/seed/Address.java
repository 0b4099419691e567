package org.notchwork.seed;

import org.notchwork.json.JsonObject;

/**
 * Names one stream of random numbers.
 *
 * @param experiment the id of the experiment
 * @param width the number of input bits
 * @param trial the trial, from 0
 * @param role what the numbers are for: {@link #INSTANCE}, or the label of the strategy that draws them
 */
public record Address(String experiment, int width, long trial, String role) {

    /** The role of the stream that draws the instance; shared by all strategies of a trial. */
    public static final String INSTANCE = "instance";

    /** Returns the stream that draws the instance of a trial. */
    public static Address instance(String experiment, int width, long trial) {
        return new Address(experiment, width, trial, INSTANCE);
    }

    /** Returns the stream that draws what the controls of a trial face. */
    public static Address control(String experiment, int width, long trial) {
        return new Address(experiment, width, trial, "control");
    }

    /** Returns the private stream of a strategy in the control of a trial. */
    public static Address control(String experiment, int width, long trial, String label) {
        return new Address(experiment, width, trial, "control:" + label);
    }

    /** Returns the private stream of a strategy in a trial. */
    public static Address strategy(String experiment, int width, long trial, String label) {
        return new Address(experiment, width, trial, "strategy:" + label);
    }

    /** Returns the address as JSON: the members experiment, role, trial, width. */
    JsonObject json() {
        return JsonObject.builder()
                .put("experiment", experiment)
                .put("role", role)
                .put("trial", trial)
                .put("width", width)
                .build();
    }
}

package org.notchwork.study;

/**
 * Names a cell: experiment, width, strategy. Written {@code EXPERIMENT/WIDTH/LABEL}.
 *
 * @param experiment the id of the experiment
 * @param width the number of input bits
 * @param label the label of the strategy choice
 */
public record Cell(String experiment, int width, String label) {

    /** Returns the written form. */
    public String id() {
        return experiment + "/" + width + "/" + label;
    }
}

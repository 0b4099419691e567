package org.notchwork.strategy.quantum;

import org.notchwork.json.JsonObject;

/**
 * How many words are sampled at a width.
 *
 * @param isExtra whether the number is above the n − 1 words that are needed at least
 * @param number the number
 */
public record Rounds(boolean isExtra, int number) {

    /** Returns the number of words at a width. */
    public int at(int width) {
        return isExtra ? width - 1 + number : number;
    }

    /** Returns the number for people. */
    String text() {
        return isExtra ? "n - 1 + " + number : Integer.toString(number);
    }

    /** Adds the setting to a strategy's. */
    JsonObject.Builder write(JsonObject.Builder settings) {
        return settings.put(isExtra ? "extra-rounds" : "rounds", number);
    }
}

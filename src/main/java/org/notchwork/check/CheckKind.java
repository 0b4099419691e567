package org.notchwork.check;

import java.util.Locale;

/** The kinds of cross-check, each with what it compares and where the expectation comes from. */
public enum CheckKind {
    /** Every fibre of every instance has exactly two elements, and they differ by the hidden period. */
    PROMISE("the promise, on the whole domain of every instance", "definition of the problem", true),
    /** Exhaustive search finds the hidden answer, and every answer given equals it. */
    EXHAUSTIVE_ANSWER("every answer against exhaustive search", "exhaustive search, written apart", true),
    /** A deterministic strategy run on all secrets has the mean and the worst case of its closed form. */
    ALL_SECRETS("mean and worst case over all secrets", "closed form of the law", true),
    /** The engines give one and the same outcome distribution: uniform on the words orthogonal to the period. */
    ENGINES("outcome distributions of the engines, word by word", "Simon 1997, section 3.1", true),
    /** The query count of every trial of a deterministic strategy equals its closed form. */
    CLOSED_FORM("query count of every trial against its closed form", "closed form of the law", false),
    /** The observed mean lies within five standard errors of the exact expectation. */
    THEORY_MEAN("observed mean against the exact expectation", "the law of the strategy", false),
    /** Accidental collisions are counted on the whole domain, and instances with a second exact period named. */
    ACCIDENTS("accidental collisions and second periods, counted", "exhaustive search, written apart", true),
    /** A fixed number of samples names the period as often as the bound for near promises says, at least. */
    SAMPLING_BOUND(
            "success of a fixed number of samples against the bound for a promise that holds nearly",
            "Kaplan, Leurent, Leverrier, Naya-Plasencia, CRYPTO 2016, theorem 1, sharper form",
            true),
    /** The observed distribution of query counts fits the exact one: chi-squared, corrected by Holm. */
    QUERY_DISTRIBUTION("distribution of query counts against the exact one", "the law of the strategy", false),
    /** The observed rate of right answers fits the exact probability: binomial, corrected by Holm. */
    SUCCESS_RATE("observed success rate against the exact probability", "the law of the strategy", false),
    /** No classical strategy succeeds within m queries more often than C(m, 2)/(2^n − 1), beyond chance. */
    CLASSICAL_BOUND("success within m queries against what no classical strategy can beat", "derived: see law", false),
    /** What is hidden is not named where it is not there, beyond chance. */
    CONTROL("how often a control names what it cannot have found, against guessing", "counting", false);

    private final String statement;
    private final String source;
    private final boolean exhaustive;

    CheckKind(String statement, String source, boolean exhaustive) {
        this.statement = statement;
        this.source = source;
        this.exhaustive = exhaustive;
    }

    /** Returns the word in files, for example {@code all-secrets}. */
    public String word() {
        return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** Returns what is compared. */
    public String statement() {
        return statement;
    }

    /** Returns where the expectation comes from. */
    public String source() {
        return source;
    }

    /** Returns whether the check needs the instances again; if not, the trial lines are enough. */
    public boolean needsInstances() {
        return exhaustive;
    }
}

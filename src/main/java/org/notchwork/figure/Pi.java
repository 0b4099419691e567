package org.notchwork.figure;

import java.math.BigDecimal;

/** The number π. */
final class Pi {

    /** π to 100 places after the point (OEIS A000796); the tests compute it anew. */
    static final BigDecimal VALUE = new BigDecimal("3."
            + "14159265358979323846264338327950288419716939937510"
            + "58209749445923078164062862089986280348253421170679");

    private Pi() {}
}

package org.notchwork.law;

/** One query, whatever the instance. */
public record OneQueryLaw() implements ConstantCountLaw {

    @Override
    public long count(int width) {
        return 1;
    }

    @Override
    public String formula() {
        return "1";
    }

    @Override
    public String source() {
        return "Deutsch and Jozsa, Proc. R. Soc. A 439 (1992); Bernstein and Vazirani, SIAM J. Comput. 26 (1997)";
    }
}

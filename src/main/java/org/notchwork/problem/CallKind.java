package org.notchwork.problem;

/** How the oracle was used. One use counts one, whatever the kind. */
public enum CallKind {
    /** One evaluation at one point, while searching. */
    CLASSICAL,
    /** One use of U_f: |x⟩|z⟩ → |x⟩|z ⊕ f(x)⟩. */
    QUANTUM,
    /** One use of the inverse of U_f. */
    INVERSE,
    /** One evaluation at one point that confirms a candidate already found; reported apart. */
    CONFIRMING
}

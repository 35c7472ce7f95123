package org.ductledger.catalogue;

/** The partial derivative of a result with respect to one argument, in the coherent units of both. */
public sealed interface Sensitivity {
    /** A closed derivative. */
    record Exact(Kernel derivative) implements Sensitivity {}

    /** No closed derivative is kept: central differences are taken. */
    record Numeric() implements Sensitivity {}

    /** The argument is a word. */
    record None() implements Sensitivity {}
}

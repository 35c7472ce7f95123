package org.ductledger.catalogue;

/**
 * A family of functions, as a chapter of a handbook gathers them.
 *
 * @param name lower snake case: {@code isentropic}
 * @param title one line
 */
public record Family(String name, String title) {}

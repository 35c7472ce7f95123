package org.ductledger.catalogue;

/** One revision of a function: its number, from 1, and the one-line reason for it. */
public record Revision(int number, String reason) {}

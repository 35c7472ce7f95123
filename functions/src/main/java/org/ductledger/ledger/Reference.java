package org.ductledger.ledger;

/** The result of the earlier call with this id. */
public record Reference(String id) implements Given {}

package org.ductledger.ledger;

import org.ductledger.catalogue.FaultKind;
import org.jspecify.annotations.Nullable;

/**
 * Why one row has no value.
 *
 * @param argument the argument to blame; {@code null} where it is none alone
 * @param given what was given for it, in the unit in which it was given: a {@code Double} or a {@code String}
 * @param detail what is required and what was given
 */
public record Fault(
        int row,
        FaultKind kind,
        @Nullable String argument,
        @Nullable Object given,
        String detail) {}

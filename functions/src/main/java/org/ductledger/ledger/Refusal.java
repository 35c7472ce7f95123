package org.ductledger.ledger;

import org.ductledger.catalogue.FaultKind;
import org.jspecify.annotations.Nullable;

/**
 * Why a whole ledger cannot be evaluated.
 *
 * @param call the place of the call in the ledger; -1 for {@code want}
 * @param argument the argument; {@code null} where the call itself (its function, id or unit) is to blame
 */
public record Refusal(FaultKind kind, int call, @Nullable String argument, String detail) {}

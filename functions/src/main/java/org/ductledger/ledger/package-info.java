/** Ledgers, ordered lists of calls, and their one evaluator. */
@NullMarked
package org.ductledger.ledger;

import org.jspecify.annotations.NullMarked;

/** The ledger sheet: the machine-readable record that a workbook carries of itself. */
@NullMarked
package org.ductledger.record;

import org.jspecify.annotations.NullMarked;

/** What tests measure with: units in the last place, and formulas in 60-digit arithmetic. */
@NullMarked
package org.ductledger.exact;

import org.jspecify.annotations.NullMarked;

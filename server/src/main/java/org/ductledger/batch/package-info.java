/** Documents to ledgers and outcomes to documents: JSON and CSV, read strictly. */
@NullMarked
package org.ductledger.batch;

import org.jspecify.annotations.NullMarked;

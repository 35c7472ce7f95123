/** Audits: a workbook's record evaluated again and held against its cells. */
@NullMarked
package org.ductledger.audit;

import org.jspecify.annotations.NullMarked;

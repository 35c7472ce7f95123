/** What a workbook is made of: styles, names, tables, charts, print set-up, and writing it to the same bytes. */
@NullMarked
package org.ductledger.sheet;

import org.jspecify.annotations.NullMarked;

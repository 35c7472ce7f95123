/** Ready-made design calculations: each a labelled ledger and a layout, and the builder that makes workbooks of them. */
@NullMarked
package org.ductledger.template;

import org.jspecify.annotations.NullMarked;

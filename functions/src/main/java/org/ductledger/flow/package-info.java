/** The families: one file each, its kernels and under them its entries. */
@NullMarked
package org.ductledger.flow;

import org.jspecify.annotations.NullMarked;

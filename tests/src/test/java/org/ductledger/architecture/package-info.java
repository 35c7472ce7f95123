/** Rules of the house that hold over all modules. */
@NullMarked
package org.ductledger.architecture;

import org.jspecify.annotations.NullMarked;

/** The types of the catalogue: what an entry says of a function, and the look-up by name. */
@NullMarked
package org.ductledger.catalogue;

import org.jspecify.annotations.NullMarked;

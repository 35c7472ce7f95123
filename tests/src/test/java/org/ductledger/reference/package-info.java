/** Published values, asked over the socket. */
@NullMarked
package org.ductledger.reference;

import org.jspecify.annotations.NullMarked;

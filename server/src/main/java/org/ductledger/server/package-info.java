/** The program's entry. */
@NullMarked
package org.ductledger.server;

import org.jspecify.annotations.NullMarked;

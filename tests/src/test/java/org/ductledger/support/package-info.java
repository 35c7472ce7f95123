/** What the tests across modules share. */
@NullMarked
package org.ductledger.support;

import org.jspecify.annotations.NullMarked;

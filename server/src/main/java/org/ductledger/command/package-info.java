/** The commands, each a few lines over the packages that do the work. */
@NullMarked
package org.ductledger.command;

import org.jspecify.annotations.NullMarked;

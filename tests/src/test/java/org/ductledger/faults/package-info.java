/** What the program does when it is handed something bad. */
@NullMarked
package org.ductledger.faults;

import org.jspecify.annotations.NullMarked;

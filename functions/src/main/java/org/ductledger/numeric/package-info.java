/** What kernels share: powers to the last digit, the balance about the sonic point, refinement steps. */
@NullMarked
package org.ductledger.numeric;

import org.jspecify.annotations.NullMarked;

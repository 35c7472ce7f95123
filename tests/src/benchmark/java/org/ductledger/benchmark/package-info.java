/** Speed, measured by ratios in one run; behind the profile {@code benchmark}. */
@NullMarked
package org.ductledger.benchmark;

import org.jspecify.annotations.NullMarked;

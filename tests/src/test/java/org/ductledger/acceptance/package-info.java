/** The main job, end to end, as a user has it. */
@NullMarked
package org.ductledger.acceptance;

import org.jspecify.annotations.NullMarked;

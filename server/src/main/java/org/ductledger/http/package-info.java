/** The service on the loopback interface: its guard, its routes, and its one way of saying what went wrong. */
@NullMarked
package org.ductledger.http;

import org.jspecify.annotations.NullMarked;

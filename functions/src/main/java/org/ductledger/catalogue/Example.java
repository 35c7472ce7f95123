package org.ductledger.catalogue;

import java.util.List;

/**
 * An executable example: arguments in the order of the entry (numbers in coherent units, or words), and the result as
 * it is printed. It holds when the result rounds to what is printed.
 *
 * @param arguments {@code Double} or {@code String} each
 * @param printed a decimal number, whose last digit tells the rounding, or a word
 */
public record Example(List<Object> arguments, String printed) {
    public Example {
        arguments = List.copyOf(arguments);
    }
}

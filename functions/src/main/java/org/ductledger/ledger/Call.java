package org.ductledger.ledger;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * One line of a ledger.
 *
 * @param id names the result within its ledger
 * @param function the catalogue's name
 * @param arguments by the arguments' names, in the order given
 * @param unit the unit wanted for the result, as typed; {@code null} means the function's own
 */
public record Call(
        String id,
        String function,
        Map<String, Given> arguments,
        @Nullable String unit) {
    public Call {
        arguments = Collections.unmodifiableMap(new LinkedHashMap<>(arguments));
    }

    public static Call of(String id, String function, Map<String, Given> arguments) {
        return new Call(id, function, arguments, null);
    }
}

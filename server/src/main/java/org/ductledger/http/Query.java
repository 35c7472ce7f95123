package org.ductledger.http;

import io.undertow.util.StatusCodes;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;

/** The parameters of a request's query, each at most once, decoded strictly. */
final class Query {
    private Query() {}

    /**
     * Reads {@code name=value&name=value}; a plus sign is a space, as forms write it.
     *
     * @param raw as it came, without the question mark; may be empty
     * @throws ProblemException if a parameter has no name, stands twice, or is badly encoded
     */
    static Map<String, String> parse(String raw) throws ProblemException {
        Map<String, String> parameters = new LinkedHashMap<>();
        if (raw.isEmpty()) {
            return parameters;
        }
        for (String pair : raw.split("&", -1)) {
            int equals = pair.indexOf('=');
            if (equals < 1) {
                throw refused("a query is made of name=value, got '" + pair + "'");
            }
            String name = decode(pair.substring(0, equals));
            if (parameters.put(name, decode(pair.substring(equals + 1))) != null) {
                throw refused(name + " is given twice");
            }
        }
        return parameters;
    }

    private static String decode(String text) throws ProblemException {
        if (text.indexOf('%') < 0) {
            return text.replace('+', ' ');
        }
        byte[] bytes = new byte[text.length()];
        int length = 0;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '%') {
                bytes[length++] = hex(text, i);
                i += 2;
            } else {
                bytes[length++] = (byte) (c == '+' ? ' ' : c);
            }
        }
        try {
            return StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes, 0, length))
                    .toString();
        } catch (CharacterCodingException e) {
            throw refused("a query is encoded in UTF-8, got '" + text + "'");
        }
    }

    private static byte hex(String text, int percent) throws ProblemException {
        int high = percent + 1 < text.length() ? Character.digit(text.charAt(percent + 1), 16) : -1;
        int low = percent + 2 < text.length() ? Character.digit(text.charAt(percent + 2), 16) : -1;
        if (high < 0 || low < 0) {
            throw refused("a percent sign in a query must be followed by two hexadecimal digits, got '" + text + "'");
        }
        return (byte) (16 * high + low);
    }

    private static ProblemException refused(String detail) {
        return new ProblemException(StatusCodes.BAD_REQUEST, "Query refused", detail);
    }
}

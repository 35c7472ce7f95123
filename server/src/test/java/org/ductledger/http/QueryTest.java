package org.ductledger.http;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class QueryTest {
    @Test
    void decodesNamesAndValues() throws ProblemException {
        assertEquals(Map.of(), Query.parse(""));
        assertEquals(Map.of("p0", "7 bar", "t\u00b0", "a=b&c"), Query.parse("p0=7+bar&t%C2%B0=a=b%26c"));
        assertEquals(Map.of("x", "", "y", "1+1"), Query.parse("x=&y=1%2b1"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"x", "=1", "&", "x=1&", "x=1&x=1", "x=%", "x=%4", "x=%zz", "x=%ff", "x=%c3%28"})
    void refusesWhatIsNotNameAndValueOnce(String query) {
        ProblemException refused = assertThrows(ProblemException.class, () -> Query.parse(query));
        assertEquals(400, refused.problem().status());
    }
}

package org.ductledger.reference;

import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.ductledger.support.Service;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/**
 * Worked examples of textbooks as JSON ledgers over the socket: the inputs are the book's, the expected value and its
 * tolerance are what the book prints. {@code worked_examples.csv} names book, example and how the value was had.
 */
final class WorkedExamplesValidationTest {
    private static final Map<String, PublishedRow> ROWS = PublishedRow.of("worked_examples.csv").stream()
            .collect(Collectors.toMap(PublishedRow::id, Function.identity()));
    private static final JsonNode LEDGERS = read("worked_examples_ledgers.json");
    private static final JsonNode NOT_ANSWERED = read("worked_examples_not_answered.json");

    private static Service service;

    @BeforeAll
    static void start() {
        service = Service.start();
    }

    @AfterAll
    static void stop() {
        service.close();
    }

    private static JsonNode read(String resource) {
        try (InputStream stream = Objects.requireNonNull(
                WorkedExamplesValidationTest.class.getResourceAsStream("/reference/" + resource))) {
            return new ObjectMapper().readTree(stream);
        } catch (IOException e) {
            throw new IllegalStateException(e);
        }
    }

    @TestFactory
    Stream<DynamicTest> everyExample() {
        List<DynamicTest> tests = new ArrayList<>();
        for (JsonNode example : LEDGERS) {
            PublishedRow row =
                    Objects.requireNonNull(ROWS.get(example.get("row").asText()));
            tests.add(DynamicTest.dynamicTest(row.id() + " " + row.quantity(), () -> row.check(answer(example))));
        }
        return tests.stream();
    }

    /** The wanted value, turned into what the book prints: over another one, plus a number, to a power, times a factor. */
    private static double answer(JsonNode example) {
        String body = new ObjectMapper()
                .createObjectNode()
                .set("ledger", example.get("ledger"))
                .toString();
        double value = service.wanted(body, example.get("want").asText());
        double over =
                example.has("over") ? service.wanted(body, example.get("over").asText()) : 1;
        double sum = value / over + example.path("plus").asDouble(0);
        return Math.pow(sum, example.path("power").asDouble(1))
                * example.path("factor").asDouble(1);
    }

    @Test
    void everyRowIsAskedOrNamedWithItsReason() {
        List<String> asked = new ArrayList<>();
        LEDGERS.forEach(example -> asked.add(example.get("row").asText()));
        for (PublishedRow row : ROWS.values()) {
            assertTrue(
                    asked.contains(row.id()) || NOT_ANSWERED.has(row.id()),
                    () -> row.id() + " (" + row.quantity() + ") is neither asked nor named");
        }
    }
}

package org.ductledger.batch;

import static java.nio.charset.StandardCharsets.UTF_8;
import static java.util.Objects.requireNonNull;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Given;
import org.ductledger.template.Template;
import org.ductledger.template.Templates;
import org.junit.jupiter.api.Test;

/** The catalogue and the templates as JSON, read back by the library's tree model. */
class EntryWriterTest {
    @Test
    void writesEverythingOfAnEntry() throws IOException {
        FunctionEntry entry = StandardCatalogue.get().find("t_over_t0").orElseThrow();
        JsonNode json = new ObjectMapper().readTree(EntryWriter.one(entry));
        assertEquals("""
                {"name":"gamma","symbol":"gamma","meaning":"ratio of the specific heats cp/cv, constant",\
                "unit":"1","interval":{"above":1.0,"at_most":100.0},"sensitivity":"exact"}""", json.get("arguments").get(1).toString());
        assertEquals(
                "{\"symbol\":\"T/T0\",\"unit\":\"1\",\"interval\":{\"at_least\":0.0,\"at_most\":1.0}}",
                json.get("result").toString());
        assertEquals(
                "NACA Report 1135: Equations, Tables, and Charts for Compressible Flow",
                json.at("/sources/0/title").asText());
        assertEquals(1953, json.at("/sources/0/year").asInt());
        assertEquals(
                "{\"with\":{\"mach\":2.0,\"gamma\":1.4},\"gives\":\"0.5556\"}",
                json.get("example").toString());
        assertEquals(
                "[{\"number\":1,\"reason\":\"first release\"}]",
                json.get("revisions").toString());
        assertTrue(json.at("/cell_form/formula").asText().contains("{gamma}"));
        assertEquals("isentropic", json.get("family").asText());
        assertEquals("[]", json.get("conditions").toString());
    }

    @Test
    void writesEveryEntryOfTheCatalogueInItsOrder() throws IOException {
        JsonNode json = new ObjectMapper().readTree(EntryWriter.all(StandardCatalogue.get()));
        assertEquals("1.0.0", json.get("library").asText());
        int i = 0;
        for (FunctionEntry entry : StandardCatalogue.get().entries()) {
            JsonNode written = json.get("functions").get(i++);
            assertEquals(entry.name(), written.get("name").asText());
            assertEquals(entry.arguments().size(), written.get("arguments").size());
            assertEquals(entry.cellForm().exists(), written.get("cell_form").has("formula"));
        }
        assertEquals(i, json.get("functions").size());
    }

    @Test
    void writesTemplatesWithDefaultsThatTheirReaderTakes() throws Exception {
        JsonNode json = new ObjectMapper().readTree(TemplateWriter.all("1.0.0", Templates.all()));
        for (Template template : Templates.all()) {
            JsonNode written = json.get("templates").get(Templates.all().indexOf(template));
            assertEquals(template.name(), written.get("name").asText());
            assertEquals(template.limits().size(), written.get("limits").size());
            assertEquals(template.cautions().size(), written.get("cautions").size());
            for (JsonNode input : written.get("inputs")) {
                byte[] asGiven = ("{\"x\": " + input.get("default") + "}").getBytes(UTF_8);
                Given.Values read = requireNonNull(
                        new LedgerReader(Limits.STANDARD).readInputs(asGiven).get("x"));
                assertEquals(input.get("rows").asInt(), read.column().rows());
            }
        }
    }
}

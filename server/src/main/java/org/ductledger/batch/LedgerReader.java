package org.ductledger.batch;

import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.Reference;
import org.jspecify.annotations.Nullable;

/** Reads ledgers, and the inputs of templates, from JSON. Thread-safe. */
public final class LedgerReader {
    private final Limits limits;
    private final JsonDocuments documents;

    public LedgerReader(Limits limits) {
        this.limits = limits;
        documents = new JsonDocuments(limits);
    }

    /**
     * Reads a ledger: {@code {"ledger": [{"id", "call", "with", "unit"}, ...], "want": [...]}}.
     *
     * @param json UTF-8
     * @throws DocumentRefusedException with the place of what is malformed, unknown, doubled, missing or too large
     */
    public Ledger read(byte[] json) throws DocumentRefusedException {
        Ledger ledger = documents.read(json, document -> new LedgerDocument(document).read());
        limits.check(ledger);
        return ledger;
    }

    /**
     * Reads a template's inputs: {@code {"gamma": 1.4, "p0": {"value": 7, "unit": "bar"}, ...}}.
     *
     * @param json UTF-8
     * @return the values by the inputs' names, in their order
     * @throws DocumentRefusedException with the place of what is malformed, doubled or too large
     */
    public Map<String, Given.Values> readInputs(byte[] json) throws DocumentRefusedException {
        return documents.read(json, document -> {
            Map<String, Given.Values> inputs = new LinkedHashMap<>();
            ValueReader reader = new ValueReader(document);
            document.object("the inputs", name -> inputs.put(name, reader.values()));
            return inputs;
        });
    }

    /** One ledger document under the reader. */
    private static final class LedgerDocument {
        private final StrictJson json;
        private final ValueReader reader;
        private int references;

        @Nullable
        List<Call> calls;

        List<String> want = List.of();

        LedgerDocument(StrictJson json) {
            this.json = json;
            reader = new ValueReader(json);
        }

        Ledger read() throws IOException, DocumentRefusedException {
            json.object("a ledger document", name -> {
                switch (name) {
                    case "ledger" -> calls = calls();
                    case "want" -> want = want();
                    default -> throw json.unknown(name, "ledger, want");
                }
            });
            return new Ledger(json.required(calls, "ledger"), want);
        }

        private List<Call> calls() throws IOException, DocumentRefusedException {
            List<Call> list = new ArrayList<>();
            json.array("the ledger", json.limits().calls(), index -> list.add(call()));
            if (list.isEmpty()) {
                throw json.refused(Reason.MISSING_MEMBER, "a ledger has at least one call");
            }
            return list;
        }

        private List<String> want() throws IOException, DocumentRefusedException {
            List<String> ids = new ArrayList<>();
            json.array("the ids wanted", json.limits().calls(), index -> ids.add(json.text("a call's id")));
            if (ids.isEmpty()) {
                throw json.refused(
                        Reason.MISSING_MEMBER, "want names at least one call; leave it out to have the results of all");
            }
            return ids;
        }

        /** The members of a call, as far as they are read. */
        private static final class Parts {
            @Nullable
            String id;

            @Nullable
            String function;

            @Nullable
            Map<String, Given> with;

            @Nullable
            String unit;
        }

        private Call call() throws IOException, DocumentRefusedException {
            Parts parts = new Parts();
            json.object("a call", name -> {
                switch (name) {
                    case "id" -> parts.id = json.text("the call's id");
                    case "call" -> parts.function = json.text("a function's name");
                    case "with" -> parts.with = with();
                    case "unit" -> parts.unit = json.text("a unit's symbol");
                    default -> throw json.unknown(name, "id, call, with, unit");
                }
            });
            return new Call(
                    json.required(parts.id, "id"),
                    json.required(parts.function, "call"),
                    json.required(parts.with, "with"),
                    parts.unit);
        }

        private Map<String, Given> with() throws IOException, DocumentRefusedException {
            Map<String, Given> arguments = new LinkedHashMap<>();
            json.object("the arguments by name", name -> {
                Given given = reader.given();
                if (given instanceof Reference && ++references > json.limits().references()) {
                    throw json.refused(
                            Reason.LIMIT_EXCEEDED,
                            "a ledger may have at most " + json.limits().references() + " references");
                }
                arguments.put(name, given);
            });
            return arguments;
        }
    }
}

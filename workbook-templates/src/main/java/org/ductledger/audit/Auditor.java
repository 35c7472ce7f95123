package org.ductledger.audit;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.ductledger.catalogue.FunctionEntry;
import org.ductledger.catalogue.Revision;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.LedgerRefusedException;
import org.ductledger.ledger.Outcome;
import org.ductledger.ledger.Refusal;
import org.ductledger.record.LedgerRecord;
import org.ductledger.record.RecordDigest;
import org.ductledger.record.RecordPlaces;
import org.ductledger.record.RecordReader;
import org.ductledger.record.RecordedCall;
import org.ductledger.record.UnreadableWorkbookException;
import org.ductledger.record.WorkbookFile;
import org.ductledger.template.WorkbookBuilder;

/**
 * Audits workbooks: evaluates the recorded ledger again and compares inputs, filled values, live formulas, ledger lines
 * and digest, cell by cell. Thread-safe.
 */
public final class Auditor {
    private final Evaluator evaluator;

    public Auditor(Evaluator evaluator) {
        this.evaluator = evaluator;
    }

    /**
     * Audits one workbook.
     *
     * @param workbook an XLSX file
     * @throws UnreadableWorkbookException if it is no workbook with a record, naming the place
     */
    public AuditReport audit(byte[] workbook) throws UnreadableWorkbookException {
        try (XSSFWorkbook book = WorkbookFile.open(workbook)) {
            return audit(book);
        } catch (IOException e) {
            throw new UncheckedIOException("a workbook in memory could not be closed", e);
        }
    }

    private AuditReport audit(XSSFWorkbook book) throws UnreadableWorkbookException {
        LedgerRecord record = RecordReader.read(book);
        List<Finding> findings = new ArrayList<>();
        Cells cells = new Cells(book);
        RecordPlaces places = new RecordPlaces(book);
        checkDigest(record, places, findings);
        checkRevisions(record, places, findings);

        InputCheck inputs = new InputCheck(cells, findings);
        LedgerRecord standing = inputs.asItStands(record);
        FilledCheck filled = new FilledCheck(cells, findings);
        Map<String, Outcome> recorded = evaluate(record, places, findings);
        for (RecordedCall call : record.calls()) {
            Outcome outcome = recorded.get(call.id());
            if (outcome != null) {
                filled.check(call, outcome);
            }
        }
        LiveCheck live = new LiveCheck(book, cells, findings);
        Map<String, Outcome> now = standing.equals(record) ? recorded : evaluate(standing, places, findings);
        for (RecordedCall call : record.calls()) {
            Outcome outcome = now.get(call.id());
            if (outcome != null) {
                live.check(call, outcome);
            }
        }
        new FormulaCheck(new WorkbookBuilder(evaluator), cells, findings).check(record);
        return new AuditReport(
                record.template(),
                record.templateVersion(),
                record.library(),
                evaluator.catalogue().version(),
                record.calls().size(),
                inputs.compared() + filled.compared() + live.compared(),
                inBookOrder(book, findings));
    }

    private static void checkDigest(LedgerRecord record, RecordPlaces places, List<Finding> findings) {
        if (!RecordDigest.holds(record)) {
            findings.add(new Finding(
                    Finding.Kind.DIGEST_DIFFERS,
                    places.sheet(),
                    places.ofDigest(),
                    "digest",
                    record.digest(),
                    RecordDigest.of(record),
                    "a line of the record was changed after the fill"));
        }
    }

    private void checkRevisions(LedgerRecord record, RecordPlaces places, List<Finding> findings) {
        for (RecordedCall call : record.calls()) {
            FunctionEntry entry = evaluator.catalogue().find(call.function()).orElse(null);
            if (entry != null && entry.revision() != call.revision()) {
                findings.add(new Finding(
                        Finding.Kind.REVISION_CHANGED,
                        places.sheet(),
                        places.ofCall(call.id()),
                        call.id(),
                        call.function() + " revision " + call.revision(),
                        "revision " + entry.revision(),
                        "since then: " + reasons(entry, call.revision())));
            }
        }
    }

    private static String reasons(FunctionEntry entry, int since) {
        return String.join(
                "; ",
                entry.revisions().stream()
                        .filter(revision -> revision.number() > since)
                        .map(Revision::reason)
                        .toList());
    }

    /** The outcomes by id; a ledger that is refused gives none, and a finding for each reason. */
    private Map<String, Outcome> evaluate(LedgerRecord record, RecordPlaces places, List<Finding> findings) {
        Map<String, Outcome> outcomes = new TreeMap<>();
        try {
            evaluator.evaluate(record.ledger()).forEach(outcome -> outcomes.put(outcome.id(), outcome));
        } catch (LedgerRefusedException e) {
            e.refusals().forEach(refusal -> findings.add(refused(record, places, refusal)));
        }
        return outcomes;
    }

    private static Finding refused(LedgerRecord record, RecordPlaces places, Refusal refusal) {
        RecordedCall call = record.calls().get(refusal.call());
        return new Finding(
                Finding.Kind.CALL_REFUSED,
                places.sheet(),
                places.ofCall(call.id()),
                call.id(),
                call.function() + " revision " + call.revision(),
                "no evaluation",
                refusal.detail());
    }

    /** Sheet by sheet as the workbook has them, each in the order in which its findings were made. */
    private static List<Finding> inBookOrder(XSSFWorkbook book, List<Finding> findings) {
        List<Finding> sorted = new ArrayList<>(findings);
        sorted.sort(Comparator.comparingInt(finding -> book.getSheetIndex(finding.sheet())));
        return sorted;
    }
}

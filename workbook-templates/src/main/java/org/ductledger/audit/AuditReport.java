package org.ductledger.audit;

import java.util.List;

/**
 * What an audit came to.
 *
 * @param template the template's name, as recorded
 * @param templateVersion as recorded
 * @param libraryThen the library's version at the fill
 * @param libraryNow today's
 * @param calls how many calls were evaluated again
 * @param cells how many cells were compared: inputs, filled values and live formulas
 * @param findings the differences, in the order of the workbook; none in a clean one
 */
public record AuditReport(
        String template,
        int templateVersion,
        String libraryThen,
        String libraryNow,
        int calls,
        int cells,
        List<Finding> findings) {
    public AuditReport {
        findings = List.copyOf(findings);
    }

    public boolean isClean() {
        return findings.isEmpty();
    }

    /** One sentence for a person. */
    public String verdict() {
        String checked = calls + " calls evaluated again, " + cells + " cells compared: ";
        return checked
                + (isClean()
                        ? "no difference"
                        : findings.size() == 1 ? "1 difference" : findings.size() + " differences");
    }
}

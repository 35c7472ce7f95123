package org.ductledger.template;

import java.util.List;
import org.ductledger.catalogue.FunctionEntry;

/**
 * A call of a template.
 *
 * @param id names the result, in the record and as the name of its cell
 * @param label what the workbook writes beside it
 * @param symbol the trade's symbol
 * @param entry its function
 * @param terms its arguments, in the function's order
 */
record DraftCall(String id, String label, String symbol, FunctionEntry entry, List<Term> terms) {
    DraftCall {
        terms = List.copyOf(terms);
    }
}

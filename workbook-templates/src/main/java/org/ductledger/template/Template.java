package org.ductledger.template;

import java.util.List;

/** A ready-made design calculation. */
public interface Template {
    /** The name in calls and commands, lower snake case. */
    String name();

    String title();

    /** What it is for, in a few sentences. */
    String purpose();

    /** Its version; a changed ledger or layout is a new one. */
    int version();

    /** What it asks for, in the order of the workbook. */
    List<TemplateInput> inputs();

    /** What it assumes and where it ends, a sentence each. */
    List<String> limits();

    /** What a user must heed before anything is built or pressurised, a sentence each. */
    List<String> cautions();

    /** Writes the calculation for the inputs that were chosen. */
    void write(Draft draft);
}

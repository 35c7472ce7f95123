package org.ductledger.template;

import java.util.List;
import java.util.stream.Collectors;

/** Inputs of which no workbook can be made; carries every problem found, not only the first. */
public final class InputsRefusedException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient List<InputProblem> problems;

    InputsRefusedException(List<InputProblem> problems) {
        super(problems.stream().map(InputProblem::detail).collect(Collectors.joining("; ")));
        this.problems = List.copyOf(problems);
    }

    public List<InputProblem> problems() {
        return problems;
    }
}

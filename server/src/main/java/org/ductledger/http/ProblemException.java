package org.ductledger.http;

/** A request that is answered by a problem document. */
final class ProblemException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient Problem problem;

    ProblemException(Problem problem) {
        super(problem.detail());
        this.problem = problem;
    }

    ProblemException(int status, String title, String detail) {
        this(new Problem(status, title, detail));
    }

    Problem problem() {
        return problem;
    }
}

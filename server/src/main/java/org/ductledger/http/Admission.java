package org.ductledger.http;

import io.undertow.util.StatusCodes;
import java.time.Duration;
import java.util.concurrent.Semaphore;
import java.util.concurrent.TimeUnit;

/** Counts the requests that are worked on, refuses one too many, and waits for the last one at the end. */
final class Admission {
    private final int most;
    private final Semaphore free;
    private volatile boolean ending;

    Admission(int most) {
        this.most = most;
        free = new Semaphore(most);
    }

    /** Refuses any request once the service is ending. */
    void checkOpen() throws ProblemException {
        if (ending) {
            throw new ProblemException(
                    StatusCodes.SERVICE_UNAVAILABLE,
                    "Service ending",
                    "the service is ending and takes no new requests");
        }
    }

    /** Takes a request in; {@link #leave()} must follow. */
    void enter() throws ProblemException {
        if (!free.tryAcquire()) {
            throw new ProblemException(
                    StatusCodes.SERVICE_UNAVAILABLE,
                    "Too many requests at once",
                    "the service works on at most " + most + " requests at once; try again");
        }
    }

    void leave() {
        free.release();
    }

    /**
     * Takes no more requests and waits for those that run.
     *
     * @return whether all of them ended in time
     */
    boolean end(Duration time) {
        ending = true;
        try {
            return free.tryAcquire(most, time.toMillis(), TimeUnit.MILLISECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return false;
        }
    }
}

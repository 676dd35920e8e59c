package nappe.job;

import java.util.concurrent.ExecutionException;
import java.util.concurrent.FutureTask;
import java.util.function.Supplier;

/**
 * A part of the work that is done on a thread of its own, beside what follows its start. What it throws is thrown to
 * whoever asks for its outcome, as if it had been done there.
 *
 * @param <T> what comes of it
 */
public final class Beside<T> {
    private final FutureTask<T> work;

    private Beside(FutureTask<T> work) {
        this.work = work;
    }

    /** Starts a part of the work; the program may end without it where nobody asks for its outcome. */
    public static <T> Beside<T> start(String name, Supplier<T> part) {
        FutureTask<T> work = new FutureTask<>(part::get);
        Thread thread = new Thread(work, name);
        thread.setDaemon(true);
        thread.start();
        return new Beside<>(work);
    }

    /** What came of it; waits until it is done. The same at each call. */
    public T outcome() {
        try {
            return work.get();
        } catch (ExecutionException e) {
            if (e.getCause() instanceof RuntimeException failure) {
                throw failure;
            }
            if (e.getCause() instanceof Error error) {
                throw error;
            }
            throw new IllegalStateException(e.getCause());
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("interrupted while waiting", e);
        }
    }
}

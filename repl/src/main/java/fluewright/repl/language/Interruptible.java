package fluewright.repl.language;

import java.util.concurrent.CountDownLatch;

/** Runs one piece of work at a time on a thread of its own, so that it can be ended from outside. */
final class Interruptible {
    private static final long GRACE_MILLIS = 300;
    private static final long STOP_MILLIS = 150;
    private static final int STOPS = 5;
    private static final long STACK_BYTES = 16L << 20;

    private volatile CountDownLatch over = new CountDownLatch(0);
    private volatile boolean asked;

    /** Waits until the work is done, or {@link #interrupt} was called and the work ended or given up. */
    Outcome run(Runnable work) throws InterruptedException {
        CountDownLatch end = new CountDownLatch(1);
        asked = false;
        over = end;
        Thread worker = new Thread(null, () -> guarded(work, end), "evaluation", STACK_BYTES);
        worker.setDaemon(true);
        worker.start();
        end.await();
        return asked ? awaitEnd(worker) : Outcome.DONE;
    }

    private static void guarded(Runnable work, CountDownLatch end) {
        try {
            work.run();
        } catch (ThreadDeath expected) {
            // The end that interrupt() asked for.
        } finally {
            end.countDown();
        }
    }

    void interrupt() {
        CountDownLatch end = over;
        if (end.getCount() > 0) {
            asked = true;
            end.countDown();
        }
    }

    boolean isInterrupted() {
        return asked;
    }

    private static Outcome awaitEnd(Thread worker) throws InterruptedException {
        worker.interrupt();
        worker.join(GRACE_MILLIS);
        for (int tries = 0; tries < STOPS && worker.isAlive() && stop(worker); tries++) {
            worker.join(STOP_MILLIS);
        }
        return worker.isAlive() ? Outcome.ABANDONED : Outcome.STOPPED;
    }

    /** The only way to end a loop that never looks at its interrupt flag. */
    @SuppressWarnings({"deprecation", "removal"})
    private static boolean stop(Thread thread) {
        try {
            thread.stop();
            return true;
        } catch (UnsupportedOperationException laterJava) {
            return false;
        }
    }
}

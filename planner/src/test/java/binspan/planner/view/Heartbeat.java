package binspan.planner.view;

import java.util.concurrent.CountDownLatch;
import javafx.application.Platform;

/** Asks the window's thread for a word over and over and notes how long it ever had to wait for one. */
final class Heartbeat {
    private static final double MILLI = 1e-6;

    private final Thread thread = new Thread(this::beat, "heartbeat");
    private volatile boolean stopped;
    private volatile long longest;

    void start() {
        thread.setDaemon(true);
        thread.start();
    }

    private void beat() {
        try {
            while (!stopped) {
                CountDownLatch answered = new CountDownLatch(1);
                long asked = System.nanoTime();
                Platform.runLater(answered::countDown);
                answered.await();
                longest = Math.max(longest, System.nanoTime() - asked);
                Thread.sleep(1);
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    /** Ends it; the longest wait in ms. */
    double stop() {
        stopped = true;
        return longest * MILLI;
    }
}

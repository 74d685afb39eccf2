package org.rodside.cli;

import java.io.PrintWriter;
import java.util.function.DoubleConsumer;

/**
 * One line on a terminal that says how far a long job is; nothing at all where output is piped or redirected. Takes a
 * share done from 0 to 1 from any thread; draws at most five times a second; leaves no trace when closed.
 */
final class Progress implements DoubleConsumer, AutoCloseable {

    /** Shortest time between two drawings; in ns. */
    private static final long PAUSE = 200_000_000L;

    private final String label;
    private final PrintWriter err;
    private final boolean shown;
    private long next = System.nanoTime() + PAUSE;
    private String drawn = "";

    Progress(String label, PrintWriter err, boolean shown) {
        this.label = label;
        this.err = err;
        this.shown = shown;
    }

    /** A line on this writer, drawn only while a person sits at a terminal. */
    static Progress on(String label, PrintWriter err) {
        return new Progress(label, err, System.console() != null);
    }

    @Override
    public synchronized void accept(double done) {
        if (!shown || System.nanoTime() - next < 0) {
            return;
        }
        next = System.nanoTime() + PAUSE;
        draw(label + " " + Math.round(done * 100) + " %");
    }

    @Override
    public synchronized void close() {
        if (!drawn.isEmpty()) {
            draw("");
            err.print('\r');
            err.flush();
        }
    }

    private void draw(String text) {
        err.print('\r' + text + " ".repeat(Math.max(0, drawn.length() - text.length())));
        err.flush();
        drawn = text;
    }
}

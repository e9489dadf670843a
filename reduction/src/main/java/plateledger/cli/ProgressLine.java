package plateledger.cli;

import java.io.PrintWriter;
import java.util.Locale;
import plateledger.reduce.Progress;

/** Progress as one line that is written over, for a person at a terminal; silent otherwise. */
final class ProgressLine implements Progress {
    private static final int WIDTH = 60;
    private static final long EVERY_NS = 100_000_000L;

    private final PrintWriter err;
    private final boolean shown;
    private long last = Long.MIN_VALUE;
    private boolean dirty;

    ProgressLine(Terminal terminal, boolean quiet) {
        this.err = terminal.err();
        this.shown = terminal.interactive() && !quiet;
    }

    @Override
    public synchronized void step(String what, double fraction) {
        long now = System.nanoTime();
        if (!shown || (last != Long.MIN_VALUE && now - last < EVERY_NS)) {
            return;
        }
        last = now;
        dirty = true;
        String text = String.format(Locale.ROOT, "%3.0f %%  %s", 100.0 * fraction, what);
        err.print('\r' + String.format(Locale.ROOT, "%-" + WIDTH + "s", cut(text)));
        err.flush();
    }

    @Override
    public boolean cancelled() {
        return false;
    }

    /** Wipes the line. */
    synchronized void end() {
        if (dirty) {
            err.print('\r' + " ".repeat(WIDTH) + '\r');
            err.flush();
        }
    }

    private static String cut(String text) {
        return text.length() > WIDTH ? text.substring(0, WIDTH) : text;
    }
}

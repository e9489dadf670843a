package plateledger.gui.task;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.reflect.InvocationTargetException;
import java.nio.file.Path;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.Predicate;
import javax.swing.SwingUtilities;
import org.junit.jupiter.api.Test;
import plateledger.finding.RefusedException;
import plateledger.gui.SampleCampaign;
import plateledger.gui.model.Freshness;
import plateledger.gui.model.WindowModel;
import plateledger.gui.model.WindowState;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.Progress;

/** The event thread works without a display, so these run everywhere. */
final class BackgroundRunnerTest {
    private static final Path DOOR = Path.of("door");
    private final WindowModel model = new WindowModel();

    @Test
    void bringsTheResultBackFromAnotherThread() throws Exception {
        CompletableFuture<Boolean> onEventThread = new CompletableFuture<>();
        WindowState end = run((folder, progress) -> {
            onEventThread.complete(SwingUtilities.isEventDispatchThread());
            return SampleCampaign.result();
        });
        assertFalse(onEventThread.get(1, TimeUnit.SECONDS), "the work must leave the event thread");
        assertEquals(Freshness.CURRENT, end.freshness());
        assertTrue(end.shown().isPresent());
    }

    @Test
    void aRefusalBecomesANoticeWithItsFindings() throws Exception {
        WindowState end = run((folder, progress) -> {
            throw new RefusedException(SampleCampaign.result().findings());
        });
        assertEquals(4, end.notice().orElseThrow().findings().size());
    }

    @Test
    void aFaultBecomesASentenceNotAStackTrace() throws Exception {
        WindowState end = run((folder, progress) -> {
            throw new IllegalStateException("strip 9 is missing");
        });
        assertEquals(
                "IllegalStateException: strip 9 is missing",
                end.notice().orElseThrow().body());
    }

    @Test
    void stoppingEndsTheWorkAndIsTold() throws Exception {
        CountDownLatch begun = new CountDownLatch(1);
        BackgroundRunner runner = new BackgroundRunner(model, (folder, progress) -> untilStopped(begun, progress));
        CompletableFuture<WindowState> end = when(state -> state.notice().isPresent());
        SwingUtilities.invokeAndWait(() -> runner.start(DOOR));
        assertTrue(begun.await(10, TimeUnit.SECONDS));
        SwingUtilities.invokeAndWait(runner::stop);
        assertEquals(
                "The reduction of door was stopped",
                end.get(10, TimeUnit.SECONDS).notice().orElseThrow().heading());
    }

    @Test
    void aSecondStartStopsTheFirstWhoseEndIsNotHeard() throws Exception {
        CountDownLatch begun = new CountDownLatch(1);
        CountDownLatch firstEnded = new CountDownLatch(1);
        Path other = Path.of("other");
        BackgroundRunner runner = new BackgroundRunner(model, (folder, progress) -> {
            if (folder.equals(other)) {
                return SampleCampaign.result();
            }
            try {
                return untilStopped(begun, progress);
            } finally {
                firstEnded.countDown();
            }
        });
        CompletableFuture<WindowState> end = when(state -> state.shown().isPresent());
        SwingUtilities.invokeAndWait(() -> runner.start(DOOR));
        assertTrue(begun.await(10, TimeUnit.SECONDS));
        SwingUtilities.invokeAndWait(() -> runner.start(other));
        assertEquals(other, end.get(10, TimeUnit.SECONDS).shown().orElseThrow().folder());
        assertTrue(firstEnded.await(10, TimeUnit.SECONDS));
        SwingUtilities.invokeAndWait(() -> assertTrue(model.state().notice().isEmpty()));
    }

    private static CampaignResult untilStopped(CountDownLatch begun, Progress progress) {
        begun.countDown();
        while (!progress.cancelled()) {
            Thread.onSpinWait();
        }
        throw new CancellationException();
    }

    private WindowState run(ReduceCall call) throws Exception {
        CompletableFuture<WindowState> end =
                when(state -> state.notice().isPresent() || state.shown().isPresent());
        SwingUtilities.invokeAndWait(() -> new BackgroundRunner(model, call).start(DOOR));
        return end.get(10, TimeUnit.SECONDS);
    }

    private CompletableFuture<WindowState> when(Predicate<WindowState> condition)
            throws InterruptedException, InvocationTargetException {
        CompletableFuture<WindowState> met = new CompletableFuture<>();
        SwingUtilities.invokeAndWait(() -> model.observe(state -> {
            if (condition.test(state)) {
                met.complete(state);
            }
        }));
        return met;
    }
}

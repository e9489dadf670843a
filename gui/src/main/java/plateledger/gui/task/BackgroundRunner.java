package plateledger.gui.task;

import java.lang.System.Logger;
import java.lang.System.Logger.Level;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.atomic.AtomicBoolean;
import javax.swing.SwingWorker;
import plateledger.finding.RefusedException;
import plateledger.gui.model.WindowModel;
import plateledger.reduce.CampaignResult;
import plateledger.reduce.Progress;

/**
 * Runs one reduction at a time off the event thread and brings its progress and outcome back to the model on the event
 * thread. Starting another one stops the one that runs; what the stopped one still says is not heard. All methods are to be
 * called on the event thread.
 */
public final class BackgroundRunner {
    private static final Logger LOG = System.getLogger(BackgroundRunner.class.getName());

    private final WindowModel model;
    private final ReduceCall call;
    private Optional<Work> current = Optional.empty();

    /** A runner that brings what it learns to a model. */
    public BackgroundRunner(WindowModel model, ReduceCall call) {
        this.model = model;
        this.call = call;
    }

    /** Reduces a campaign; stops the reduction that runs, if one does. */
    public void start(Path folder) {
        current.ifPresent(Work::stop);
        Work work = new Work(folder);
        current = Optional.of(work);
        model.started(folder);
        work.execute();
    }

    /** Asks the reduction that runs to stop; nothing happens if none does. */
    public void stop() {
        current.ifPresent(work -> {
            work.stop();
            model.stopping();
        });
    }

    private record Step(String what, double fraction) {}

    /** The one place that leaves the event thread. */
    private final class Work extends SwingWorker<CampaignResult, Step> {
        private final Path folder;
        private final AtomicBoolean stop = new AtomicBoolean();

        Work(Path folder) {
            this.folder = folder;
        }

        void stop() {
            stop.set(true);
        }

        @Override
        protected CampaignResult doInBackground() throws RefusedException {
            return call.reduce(folder, new Progress() {
                @Override
                public void step(String what, double fraction) {
                    publish(new Step(what, fraction));
                }

                @Override
                public boolean cancelled() {
                    return stop.get();
                }
            });
        }

        @Override
        protected void process(List<Step> steps) {
            if (isCurrent() && !steps.isEmpty()) {
                Step last = steps.get(steps.size() - 1);
                model.progressed(last.what(), last.fraction());
            }
        }

        @Override
        protected void done() {
            if (!isCurrent()) {
                return;
            }
            current = Optional.empty();
            try {
                model.finished(folder, get());
            } catch (ExecutionException thrown) {
                ended(thrown.getCause() == null ? thrown : thrown.getCause());
            } catch (InterruptedException thrown) {
                Thread.currentThread().interrupt();
                model.stopped(folder);
            }
        }

        private void ended(Throwable cause) {
            if (cause instanceof RefusedException refused) {
                model.refused(folder, refused.findings());
            } else if (cause instanceof CancellationException) {
                model.stopped(folder);
            } else {
                LOG.log(Level.ERROR, "reduction of " + folder + " failed", cause);
                String message = cause.getMessage() == null ? "" : ": " + cause.getMessage();
                model.failed(folder, cause.getClass().getSimpleName() + message);
            }
        }

        private boolean isCurrent() {
            return current.filter(work -> work == this).isPresent();
        }
    }
}

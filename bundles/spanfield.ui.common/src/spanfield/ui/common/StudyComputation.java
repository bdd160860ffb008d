/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.function.Consumer;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.swt.widgets.Display;
import spanfield.model.Study;
import spanfield.model.validation.Finding;
import spanfield.solver.Progress;
import spanfield.solver.SolverCancelledException;
import spanfield.study.InvalidStudyException;
import spanfield.study.StudyCheck;
import spanfield.study.StudyRun;
import spanfield.study.StudySnapshot;
import spanfield.study.result.EdgeTable;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.StationInfo;

/**
 * Computes the results of a document in the background. A request takes an immutable snapshot on the user-interface thread and cancels
 * whatever was running for an older one; results come back to the listeners on the user-interface thread, the chosen station's profile
 * first. Coefficients of unchanged geometry are remembered between requests.
 */
public final class StudyComputation {

    /** What the computation is doing. */
    public enum State {
        /** Nothing was asked yet. */
        IDLE,
        /** A job runs; results of the newest snapshot may still be incomplete. */
        COMPUTING,
        /** The results belong to the present state of the study. */
        DONE,
        /** The study has errors; there are no results. */
        INVALID,
        /** The computation failed; the message says why. */
        FAILED
    }

    /**
     * The state of the computation at a moment. Immutable.
     *
     * @param state    what is going on
     * @param findings everything that the checks have found
     * @param profiles profiles by identifier of the station, those that are ready
     * @param edges    edge table, or null while it is not ready
     * @param snapshot the study that the results belong to, or null without results
     * @param message  why it failed, or empty
     */
    public record Outcome(State state, List<Finding> findings, Map<String, LateralProfile> profiles, EdgeTable edges, StudySnapshot snapshot,
        String message) {

        static final Outcome NOTHING = new Outcome(State.IDLE, List.of(), Map.of(), null, null, "");

        /** Number of findings that are errors. */
        public long errors() {
            return findings.stream().filter(Finding::isError).count();
        }
    }

    private final StudyDocument document;
    private final Display display;
    private final StudyRun run = new StudyRun();
    private final List<Consumer<Outcome>> listeners = new CopyOnWriteArrayList<>();
    private Outcome outcome = Outcome.NOTHING;
    private Job job;
    private String firstStation = "";
    private Study preview;
    private boolean requested;
    private boolean disposed;

    StudyComputation(StudyDocument document, Display display) {
        this.document = document;
        this.display = display;
    }

    /** The newest outcome. */
    public Outcome outcome() {
        return outcome;
    }

    /** Listeners are called on the user-interface thread. */
    public void addListener(Consumer<Outcome> listener) {
        listeners.add(listener);
    }

    public void removeListener(Consumer<Outcome> listener) {
        listeners.remove(listener);
    }

    /** The station whose profile is wanted first, by identifier. */
    public void prefer(String stationId) {
        firstStation = stationId;
    }

    /**
     * Asks for results of a study that is not the document's: what a drag would make of it. The next request, or another preview, supersedes
     * it.
     *
     * @param changed a changed copy of the study; ownership passes on
     */
    public void preview(Study changed) {
        preview = changed;
        ask();
    }

    /** Asks for results of the study as it is now. Several requests within one event are one. */
    public void request() {
        preview = null;
        ask();
    }

    private void ask() {
        if (!requested && !disposed) {
            requested = true;
            display.asyncExec(this::start);
        }
    }

    private void start() {
        requested = false;
        if (disposed) {
            return;
        }
        cancel();
        try {
            Study study = preview == null ? document.study() : preview;
            StudySnapshot snapshot = StudySnapshot.of(study);
            // A preview keeps the findings: its objects are not the document's.
            List<Finding> findings = preview == null ? StudyCheck.check(study) : outcome.findings();
            publish(new Outcome(State.COMPUTING, findings, outcome.profiles(), outcome.edges(), outcome.snapshot(), ""));
            job = new ComputeJob(snapshot, findings);
            job.setPriority(Job.INTERACTIVE);
            job.setSystem(true);
            job.schedule();
        } catch (InvalidStudyException invalid) {
            if (preview != null) {
                return;
            }
            publish(new Outcome(State.INVALID, invalid.findings(), Map.of(), null, null, ""));
        }
    }

    /** Stops what is running; the results stay as they are. */
    public void cancel() {
        if (job != null) {
            job.cancel();
            job = null;
        }
    }

    void dispose() {
        disposed = true;
        cancel();
        listeners.clear();
    }

    private void publish(Outcome fresh) {
        outcome = fresh;
        listeners.forEach(listener -> listener.accept(fresh));
    }

    /** One computation. Knows only the snapshot; never touches the model or a widget. */
    private final class ComputeJob extends Job {

        private final StudySnapshot snapshot;
        private final List<Finding> findings;

        ComputeJob(StudySnapshot snapshot, List<Finding> findings) {
            super("Computing the field of " + snapshot.studyName());
            this.snapshot = snapshot;
            this.findings = findings;
        }

        @Override
        public boolean belongsTo(Object family) {
            return family == StudyComputation.class || family == StudyComputation.this;
        }

        @Override
        protected IStatus run(IProgressMonitor monitor) {
            Progress progress = new Progress() {
                @Override
                public void report(double fraction) {
                    // too short to show
                }

                @Override
                public boolean cancelled() {
                    return monitor.isCanceled();
                }
            };
            try {
                Map<String, LateralProfile> profiles = new LinkedHashMap<>();
                for (StationInfo station : inOrder()) {
                    profiles.put(station.id(), run.profile(snapshot, station, progress));
                    post(new Outcome(State.COMPUTING, findings, Map.copyOf(profiles), null, snapshot, ""), monitor);
                }
                EdgeTable edges = run.edgeTable(snapshot, progress);
                post(new Outcome(State.DONE, findings, Map.copyOf(profiles), edges, snapshot, ""), monitor);
                return Status.OK_STATUS;
            } catch (SolverCancelledException cancelled) {
                return Status.CANCEL_STATUS;
            } catch (RuntimeException failure) {
                String message = failure.getMessage() == null ? failure.getClass().getSimpleName() : failure.getMessage();
                post(new Outcome(State.FAILED, findings, Map.of(), null, snapshot, message), monitor);
                return Status.OK_STATUS;
            }
        }

        /** The stations, the preferred one first. */
        private List<StationInfo> inOrder() {
            List<StationInfo> stations = new ArrayList<>(snapshot.stations());
            stations.sort((a, b) -> Boolean.compare(b.id().equals(firstStation), a.id().equals(firstStation)));
            return stations;
        }

        private void post(Outcome fresh, IProgressMonitor monitor) {
            if (display.isDisposed()) {
                return;
            }
            display.asyncExec(() -> {
                if (!disposed && job == this && !monitor.isCanceled()) {
                    publish(fresh);
                }
            });
        }
    }
}

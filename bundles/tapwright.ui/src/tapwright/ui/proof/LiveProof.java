// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.proof;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.function.Consumer;

import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.IJobFunction;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.swt.widgets.Display;

import tapwright.core.verify.FilterEvidence;
import tapwright.dsp.Progress;
import tapwright.dsp.verify.Effort;

/**
 * Keeps the evidence of a filter that is being edited up to date. The newest question wins: an answer that comes late is dropped.
 * UI thread.
 */
public final class LiveProof {


	// Work in a window must stay fluent; the builder takes the standard time after saving.
	private static final Duration TIME_LIMIT = Duration.ofSeconds(2);

	private final Display display;
	private final List<Consumer<Proven>> listeners = new ArrayList<>();
	private Proven latest;
	private Job job;
	private int request;
	private boolean disposed;

	/** Proofs whose answers are shown on the given display. */
	public LiveProof(Display display) {
		this.display = display;
	}

	/** Tells whenever there is something new to show: first the question with the old answer, then the new answer. */
	public void addListener(Consumer<Proven> listener) {
		listeners.add(listener);
	}

	/** Removes a listener. */
	public void removeListener(Consumer<Proven> listener) {
		listeners.remove(listener);
	}

	/** The newest question with the newest answer; nothing before the first answer. */
	public Optional<Proven> latest() {
		return Optional.ofNullable(latest);
	}

	/** Asks a new question; nothing happens when it is the same as the last. */
	public void ask(FilterSnapshot snapshot) {
		if (latest != null && latest.snapshot().question().hash().equals(snapshot.question().hash())) {
			return;
		}
		int number = ++request;
		if (job != null) {
			job.cancel();
		}
		if (latest != null) {
			publish(new Proven(snapshot, latest.evidence(), true));
		}
		job = Job.create("Proving " + snapshot.name(), (IJobFunction) monitor -> answer(snapshot, number, monitor));
		job.setSystem(true);
		job.setPriority(Job.SHORT);
		job.schedule();
	}

	// job thread
	private IStatus answer(FilterSnapshot snapshot, int number, IProgressMonitor monitor) {
		try {
			FilterEvidence evidence = snapshot.question().answer(new Effort(progress(monitor), TIME_LIMIT));
			display.asyncExec(() -> {
				if (number == request && !disposed) {
					publish(new Proven(snapshot, evidence, false));
				}
			});
			return Status.OK_STATUS;
		} catch (CancellationException e) {
			return Status.CANCEL_STATUS;
		}
	}

	private static Progress progress(IProgressMonitor monitor) {
		return new Progress() {
			@Override
			public boolean isCancelled() {
				return monitor.isCanceled();
			}
		};
	}

	private void publish(Proven proven) {
		latest = proven;
		List.copyOf(listeners).forEach(listener -> listener.accept(proven));
	}

	/** Drops what is still being proven. */
	public void dispose() {
		disposed = true;
		listeners.clear();
		if (job != null) {
			job.cancel();
		}
	}
}

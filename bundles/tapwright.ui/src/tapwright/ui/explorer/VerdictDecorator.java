// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.explorer;

import java.util.List;
import java.util.Optional;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.jface.viewers.IDecoration;
import org.eclipse.jface.viewers.ILabelProviderListener;
import org.eclipse.jface.viewers.ILightweightLabelDecorator;
import org.eclipse.jface.viewers.LabelProviderChangedEvent;
import org.eclipse.core.runtime.ListenerList;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.PlatformUI;

import tapwright.dsp.verify.Verdict;
import tapwright.ui.look.Icons;
import tapwright.ui.look.Verdicts;
import tapwright.workspace.EvidenceListener;
import tapwright.workspace.PortfolioProject;
import tapwright.workspace.PresentEvidence;

/** Adds a shape and words to filters and portfolios that tell what was proven. Asked in the background, answers from memory. */
public final class VerdictDecorator implements ILightweightLabelDecorator {

	private final ListenerList<ILabelProviderListener> listeners = new ListenerList<>();
	private final EvidenceListener evidenceListener = portfolio -> refresh();

	/** Listens for new evidence. */
	public VerdictDecorator() {
		PortfolioProject.addListener(evidenceListener);
	}

	@Override
	public void decorate(Object element, IDecoration decoration) {
		switch (element) {
		case IFile file -> PortfolioProject.of(file).ifPresent(portfolio -> decorate(portfolio, file, decoration));
		case IProject project -> PortfolioProject.of(project).ifPresent(portfolio -> decorate(portfolio, decoration));
		default -> {
			// nothing is known of other things
		}
		}
	}

	private static void decorate(PortfolioProject portfolio, IFile file, IDecoration decoration) {
		Optional<PresentEvidence> evidence = portfolio.evidence(file);
		evidence.ifPresent(present -> {
			String icon = present.stale() ? Icons.STALE : Verdicts.icon(present.evidence().verdict());
			decoration.addOverlay(Icons.descriptor(icon + "_ovr"), IDecoration.BOTTOM_RIGHT);
			decoration.addSuffix("  " + (present.stale() ? "proving" : Verdicts.summary(present.evidence())));
		});
	}

	private static void decorate(PortfolioProject portfolio, IDecoration decoration) {
		portfolio.ensureVerified();
		List<PortfolioProject.FileEvidence> all = portfolio.evidence();
		if (all.isEmpty()) {
			return;
		}
		long missed = count(all, Verdict.MISSED);
		long unproven = count(all, Verdict.UNPROVEN);
		Verdict verdict = missed > 0 ? Verdict.MISSED : unproven > 0 ? Verdict.UNPROVEN : Verdict.MET;
		decoration.addOverlay(Icons.descriptor(Verdicts.icon(verdict) + "_ovr"), IDecoration.BOTTOM_RIGHT);
		decoration.addSuffix("  " + all.size() + (all.size() == 1 ? " filter" : " filters")
				+ (missed > 0 ? ", " + missed + " missed" : "") + (unproven > 0 ? ", " + unproven + " unproven" : ""));
	}

	private static long count(List<PortfolioProject.FileEvidence> all, Verdict verdict) {
		return all.stream().filter(found -> found.evidence().evidence().verdict() == verdict).count();
	}

	// build thread
	private void refresh() {
		Display display = PlatformUI.isWorkbenchRunning() ? PlatformUI.getWorkbench().getDisplay() : null;
		if (display != null && !display.isDisposed()) {
			display.asyncExec(() -> {
				var event = new LabelProviderChangedEvent(this);
				listeners.forEach(listener -> listener.labelProviderChanged(event));
			});
		}
	}

	@Override
	public void addListener(ILabelProviderListener listener) {
		listeners.add(listener);
	}

	@Override
	public void removeListener(ILabelProviderListener listener) {
		listeners.remove(listener);
	}

	@Override
	public boolean isLabelProperty(Object element, String property) {
		return false;
	}

	@Override
	public void dispose() {
		PortfolioProject.removeListener(evidenceListener);
	}
}

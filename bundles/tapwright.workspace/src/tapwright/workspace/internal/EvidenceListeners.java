// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace.internal;

import org.eclipse.core.runtime.ListenerList;
import org.eclipse.core.runtime.SafeRunner;

import tapwright.workspace.EvidenceListener;
import tapwright.workspace.PortfolioProject;

/** Who wants to hear of new evidence. Thread-safe. */
public final class EvidenceListeners {

	private static final ListenerList<EvidenceListener> LISTENERS = new ListenerList<>();

	private EvidenceListeners() {
	}

	/** Adds a listener once. */
	public static void add(EvidenceListener listener) {
		LISTENERS.add(listener);
	}

	/** Removes a listener. */
	public static void remove(EvidenceListener listener) {
		LISTENERS.remove(listener);
	}

	static void fire(PortfolioProject portfolio) {
		for (EvidenceListener listener : LISTENERS) {
			SafeRunner.run(() -> listener.evidenceChanged(portfolio)); // logs what goes wrong; the build goes on
		}
	}
}

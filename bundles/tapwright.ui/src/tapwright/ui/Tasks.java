// SPDX-License-Identifier: EPL-2.0
package tapwright.ui;

import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.ui.statushandlers.StatusManager;

/** Reports failures to the person and to the log in one way. */
public final class Tasks {

	/** Id of this bundle. */
	public static final String PLUGIN = "tapwright.ui";

	private Tasks() {
	}

	/** Shows and logs a failure. Any thread. */
	public static void show(String message, Throwable cause) {
		StatusManager.getManager().handle(error(message, cause), StatusManager.LOG | StatusManager.SHOW);
	}

	/** Logs a failure that a person need not act upon. Any thread. */
	public static void log(String message, Throwable cause) {
		StatusManager.getManager().handle(error(message, cause), StatusManager.LOG);
	}

	private static IStatus error(String message, Throwable cause) {
		return new Status(IStatus.ERROR, PLUGIN, message, cause);
	}
}

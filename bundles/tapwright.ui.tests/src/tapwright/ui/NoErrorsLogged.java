// SPDX-License-Identifier: EPL-2.0
package tapwright.ui;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;

import org.eclipse.core.runtime.ILogListener;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Platform;
import org.junit.jupiter.api.extension.AfterEachCallback;
import org.junit.jupiter.api.extension.BeforeEachCallback;
import org.junit.jupiter.api.extension.ExtensionContext;

/** Fails a test during which an error was logged, by whomever. */
final class NoErrorsLogged implements BeforeEachCallback, AfterEachCallback {

	private final List<IStatus> errors = new CopyOnWriteArrayList<>();
	private final ILogListener listener = (status, plugin) -> {
		if (status.getSeverity() == IStatus.ERROR) {
			errors.add(status);
		}
	};

	@Override
	public void beforeEach(ExtensionContext context) {
		errors.clear();
		Platform.addLogListener(listener);
	}

	@Override
	public void afterEach(ExtensionContext context) {
		Platform.removeLogListener(listener);
		assertEquals(List.of(), errors, "errors in the log");
	}
}

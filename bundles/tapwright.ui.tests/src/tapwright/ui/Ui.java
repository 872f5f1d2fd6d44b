// SPDX-License-Identifier: EPL-2.0
package tapwright.ui;

import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.fail;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import java.util.stream.Stream;

import org.eclipse.core.commands.common.CommandException;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.handlers.IHandlerService;

/** What tests do with the running workbench. UI thread. */
final class Ui {

	private static final long LONGEST_WAIT_MS = 20_000;

	private Ui() {
	}

	static IWorkbenchPage page() {
		return PlatformUI.getWorkbench().getActiveWorkbenchWindow().getActivePage();
	}

	/** Lets the window work until something is so; fails when it never comes. */
	static void waitUntil(String what, BooleanSupplier condition) {
		Display display = Display.getCurrent();
		long end = System.nanoTime() + LONGEST_WAIT_MS * 1_000_000;
		Runnable wake = new Runnable() {
			@Override
			public void run() {
				display.timerExec(20, this); // conditions may come true on other threads
			}
		};
		wake.run();
		try {
			while (!condition.getAsBoolean()) {
				if (System.nanoTime() > end) {
					fail("never came: " + what);
				}
				if (!display.readAndDispatch()) {
					display.sleep();
				}
			}
		} finally {
			display.timerExec(-1, wake);
		}
	}

	/** Executes a command of the workbench as a key or a menu would. */
	static void execute(String command) throws CommandException {
		IHandlerService handlers = PlatformUI.getWorkbench().getService(IHandlerService.class);
		handlers.executeCommand(command, null);
	}

	/** All controls of a type below a control. */
	static <T extends Control> List<T> all(Control root, Class<T> type) {
		var found = new ArrayList<T>();
		collect(root, type, found);
		return found;
	}

	private static <T extends Control> void collect(Control control, Class<T> type, List<T> found) {
		if (type.isInstance(control)) {
			found.add(type.cast(control));
		}
		if (control instanceof Composite composite) {
			Stream.of(composite.getChildren()).forEach(child -> collect(child, type, found));
		}
	}

	/** The field for a feature that can be seen. */
	static <T extends Control> T field(Control root, Class<T> type, String feature) {
		Optional<T> field = all(root, type).stream().filter(Control::isVisible)
				.filter(control -> feature.equals(control.getData("feature"))).findFirst();
		assertNotNull(field.orElse(null), "the field for " + feature);
		return field.get();
	}
}

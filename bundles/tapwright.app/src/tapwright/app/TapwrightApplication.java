// SPDX-License-Identifier: EPL-2.0
package tapwright.app;

import java.nio.file.Path;
import java.util.Optional;

import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.core.runtime.Platform;
import org.eclipse.equinox.app.IApplication;
import org.eclipse.equinox.app.IApplicationContext;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.PlatformUI;

/**
 * Opens the window and stays until it is closed. The argument {@code -portfolio FOLDER} brings the portfolios of a folder into the
 * workspace, in place, when they are not there yet.
 */
public final class TapwrightApplication implements IApplication {

	/** Id of the application in this bundle's plugin.xml. */
	public static final String ID = "tapwright.app.application";

	private static final String PORTFOLIO_ARGUMENT = "-portfolio";

	@Override
	public Object start(IApplicationContext context) throws CoreException {
		Display display = PlatformUI.createDisplay();
		try {
			int code = PlatformUI.createAndRunWorkbench(display, new TapwrightWorkbenchAdvisor(portfolioArgument()));
			ResourcesPlugin.getWorkspace().save(true, new NullProgressMonitor());
			return code == PlatformUI.RETURN_RESTART ? EXIT_RESTART : EXIT_OK;
		} finally {
			display.dispose();
		}
	}

	private static Optional<Path> portfolioArgument() {
		String[] arguments = Platform.getApplicationArgs();
		for (int k = 0; k + 1 < arguments.length; k++) {
			if (arguments[k].equals(PORTFOLIO_ARGUMENT)) {
				return Optional.of(Path.of(arguments[k + 1]).toAbsolutePath().normalize());
			}
		}
		return Optional.empty();
	}

	@Override
	public void stop() {
		if (!PlatformUI.isWorkbenchRunning()) {
			return;
		}
		var workbench = PlatformUI.getWorkbench();
		workbench.getDisplay().syncExec(workbench::close);
	}
}

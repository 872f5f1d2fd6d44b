// SPDX-License-Identifier: EPL-2.0
package tapwright.app;

import org.eclipse.equinox.app.IApplication;
import org.eclipse.equinox.app.IApplicationContext;
import org.eclipse.ui.PlatformUI;

/** Opens the window and stays until it is closed. */
public final class TapwrightApplication implements IApplication {

	/** Id of the application in this bundle's plugin.xml. */
	public static final String ID = "tapwright.app.application";

	@Override
	public Object start(IApplicationContext context) {
		var display = PlatformUI.createDisplay();
		try {
			var code = PlatformUI.createAndRunWorkbench(display, new TapwrightWorkbenchAdvisor());
			return code == PlatformUI.RETURN_RESTART ? EXIT_RESTART : EXIT_OK;
		} finally {
			display.dispose();
		}
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

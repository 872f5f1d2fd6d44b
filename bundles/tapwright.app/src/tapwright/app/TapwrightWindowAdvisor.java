// SPDX-License-Identifier: EPL-2.0
package tapwright.app;

import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.application.ActionBarAdvisor;
import org.eclipse.ui.application.IActionBarConfigurer;
import org.eclipse.ui.application.IWorkbenchWindowConfigurer;
import org.eclipse.ui.application.WorkbenchWindowAdvisor;

/** Size, title and bars of a window. */
final class TapwrightWindowAdvisor extends WorkbenchWindowAdvisor {

	private static final int USUAL_WIDTH = 1480;
	private static final int USUAL_HEIGHT = 940;

	TapwrightWindowAdvisor(IWorkbenchWindowConfigurer configurer) {
		super(configurer);
	}

	@Override
	public ActionBarAdvisor createActionBarAdvisor(IActionBarConfigurer configurer) {
		return new TapwrightActionBarAdvisor(configurer);
	}

	@Override
	public void preWindowOpen() {
		IWorkbenchWindowConfigurer configurer = getWindowConfigurer();
		Rectangle screen = Display.getCurrent().getPrimaryMonitor().getClientArea();
		configurer.setInitialSize(new Point(Math.min(USUAL_WIDTH, screen.width), Math.min(USUAL_HEIGHT, screen.height)));
		configurer.setTitle("Tapwright");
		configurer.setShowMenuBar(true);
		configurer.setShowCoolBar(true);
		configurer.setShowStatusLine(true);
		configurer.setShowProgressIndicator(true);
		configurer.setShowPerspectiveBar(false);
	}
}

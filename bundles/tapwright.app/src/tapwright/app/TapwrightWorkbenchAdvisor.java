// SPDX-License-Identifier: EPL-2.0
package tapwright.app;

import org.eclipse.ui.application.IWorkbenchConfigurer;
import org.eclipse.ui.application.WorkbenchAdvisor;
import org.eclipse.ui.ide.IDE;

/** What the workbench of the product starts with. */
public final class TapwrightWorkbenchAdvisor extends WorkbenchAdvisor {

	@Override
	public void initialize(IWorkbenchConfigurer configurer) {
		super.initialize(configurer);
		// without these adapters the Project Explorer shows resources without label and icon
		IDE.registerAdapters();
		configurer.setSaveAndRestore(true);
	}

	@Override
	public String getInitialWindowPerspectiveId() {
		return TapwrightPerspective.ID;
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.app;

import java.net.URL;
import java.nio.file.Path;
import java.util.Optional;

import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.IAdaptable;
import org.eclipse.core.runtime.Platform;
import org.eclipse.jface.resource.ImageDescriptor;
import org.eclipse.ui.application.IWorkbenchConfigurer;
import org.eclipse.ui.application.IWorkbenchWindowConfigurer;
import org.eclipse.ui.application.WorkbenchAdvisor;
import org.eclipse.ui.application.WorkbenchWindowAdvisor;
import org.eclipse.ui.ide.IDE;

import tapwright.ui.look.Icons;
import tapwright.ui.start.FirstStart;

/** What the workbench of the product starts with. */
public final class TapwrightWorkbenchAdvisor extends WorkbenchAdvisor {

	private static final String IDE_BUNDLE = "org.eclipse.ui.ide";
	private static final String IDE_ICONS = "icons/full/";

	private final Optional<Path> portfolios;

	/**
	 * @param portfolios
	 *            a folder whose portfolios belong into the workspace
	 */
	public TapwrightWorkbenchAdvisor(Optional<Path> portfolios) {
		this.portfolios = portfolios;
	}

	@Override
	public void initialize(IWorkbenchConfigurer configurer) {
		super.initialize(configurer);
		// without these adapters the Project Explorer shows resources without label and icon
		IDE.registerAdapters();
		configurer.setSaveAndRestore(true);
		configurer.declareImage(IDE.SharedImages.IMG_OBJ_PROJECT, Icons.descriptor(Icons.PORTFOLIO), true);
		configurer.declareImage(IDE.SharedImages.IMG_OBJ_PROJECT_CLOSED, Icons.descriptor(Icons.PORTFOLIO), true);
		declare(configurer, "IMG_ETOOL_PROBLEMS_VIEW", "eview16/problems_view.svg");
		declare(configurer, "IMG_ETOOL_PROBLEMS_VIEW_ERROR", "eview16/problems_view_error.svg");
		declare(configurer, "IMG_ETOOL_PROBLEMS_VIEW_WARNING", "eview16/problems_view_warning.svg");
		declare(configurer, "IMG_ETOOL_PROBLEMS_VIEW_INFO", "eview16/problems_view_info.svg");
		declare(configurer, "IMG_OBJS_ERROR_PATH", "obj16/error_tsk.svg");
		declare(configurer, "IMG_OBJS_WARNING_PATH", "obj16/warn_tsk.svg");
		declare(configurer, "IMG_OBJS_INFO_PATH", "obj16/info_tsk.svg");
		declare(configurer, "IMG_LCL_QUICK_FIX_ENABLED", "elcl16/smartmode_co.svg");
		declare(configurer, "IMG_DLCL_QUICK_FIX_DISABLED", "dlcl16/smartmode_co.svg");
	}

	// The Problems view takes its images from the workbench, which leaves it to the application to declare them.
	private static void declare(IWorkbenchConfigurer configurer, String name, String path) {
		URL url = Platform.getBundle(IDE_BUNDLE).getEntry(IDE_ICONS + path);
		if (url != null) {
			configurer.declareImage(name, ImageDescriptor.createFromURL(url), true);
		}
	}

	@Override
	public WorkbenchWindowAdvisor createWorkbenchWindowAdvisor(IWorkbenchWindowConfigurer configurer) {
		return new TapwrightWindowAdvisor(configurer);
	}

	@Override
	public IAdaptable getDefaultPageInput() {
		return ResourcesPlugin.getWorkspace().getRoot();
	}

	@Override
	public String getInitialWindowPerspectiveId() {
		return TapwrightPerspective.ID;
	}

	@Override
	public void postStartup() {
		portfolios.ifPresent(folder -> new FirstStart(folder).schedule());
	}
}

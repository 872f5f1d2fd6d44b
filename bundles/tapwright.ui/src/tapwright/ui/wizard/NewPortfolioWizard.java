// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.wizard;

import java.lang.reflect.InvocationTargetException;
import java.net.URI;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IProjectDescription;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.SubMonitor;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.wizard.Wizard;
import org.eclipse.ui.INewWizard;
import org.eclipse.ui.IWorkbench;
import org.eclipse.ui.dialogs.WizardNewProjectCreationPage;

import tapwright.model.ModelFactory;
import tapwright.model.Portfolio;
import tapwright.model.io.ModelFiles;
import tapwright.ui.Tasks;
import tapwright.workspace.PortfolioNature;

/** Starts a portfolio: a project with an empty root file. */
public final class NewPortfolioWizard extends Wizard implements INewWizard {

	private IWorkbench workbench;
	private WizardNewProjectCreationPage page;

	@Override
	public void init(IWorkbench opened, IStructuredSelection selection) {
		workbench = opened;
		setWindowTitle("New Portfolio");
		setNeedsProgressMonitor(true);
	}

	@Override
	public void addPages() {
		page = new WizardNewProjectCreationPage("portfolio");
		page.setTitle("Portfolio");
		page.setDescription("A portfolio holds all filters of one product. Its folder can be kept in version control.");
		addPage(page);
	}

	@Override
	public boolean performFinish() {
		IProject project = page.getProjectHandle();
		URI location = page.useDefaults() ? null : page.getLocationURI();
		try {
			getContainer().run(true, true, WizardTasks.operation(monitor -> {
				SubMonitor progress = SubMonitor.convert(monitor, 4);
				IProjectDescription description = ResourcesPlugin.getWorkspace().newProjectDescription(project.getName());
				description.setLocationURI(location);
				project.create(description, progress.split(1));
				project.open(progress.split(1));
				IFile root = project.getFile(ModelFiles.PORTFOLIO_FILE);
				if (!root.exists()) {
					Portfolio portfolio = ModelFactory.eINSTANCE.createPortfolio();
					portfolio.setName(project.getName());
					root.create(ModelFiles.toBytes(portfolio), IResource.FORCE, progress.split(1));
				}
				PortfolioNature.addTo(project, progress.split(1));
			}));
		} catch (InvocationTargetException e) {
			Tasks.show("The portfolio could not be made", e.getCause());
			return false;
		} catch (InterruptedException e) {
			return false; // cancelled by the person, who can change something and try again
		}
		WizardTasks.open(workbench, project.getFile(ModelFiles.PORTFOLIO_FILE));
		return true;
	}
}

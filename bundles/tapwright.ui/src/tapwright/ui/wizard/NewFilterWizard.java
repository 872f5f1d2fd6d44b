// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.wizard;

import java.lang.reflect.InvocationTargetException;
import java.util.UUID;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResource;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.wizard.Wizard;
import org.eclipse.ui.INewWizard;
import org.eclipse.ui.IWorkbench;

import tapwright.model.Filter;
import tapwright.model.ModelFactory;
import tapwright.model.io.ModelFiles;
import tapwright.ui.Tasks;

/** Adds a filter to a portfolio. */
public final class NewFilterWizard extends Wizard implements INewWizard {

	private IWorkbench workbench;
	private NewFilterPage page;

	@Override
	public void init(IWorkbench opened, IStructuredSelection selection) {
		workbench = opened;
		setWindowTitle("New Filter");
		setNeedsProgressMonitor(true);
		page = new NewFilterPage(selection);
	}

	@Override
	public void addPages() {
		addPage(page);
	}

	@Override
	public boolean performFinish() {
		IFile file = page.file();
		Filter filter = ModelFactory.eINSTANCE.createFilter();
		filter.setName(page.filterName());
		filter.setIdentity(UUID.randomUUID().toString());
		filter.setSampleRate(page.sampleRate());
		filter.setPurpose(page.purpose());
		byte[] content = ModelFiles.toBytes(filter);
		try {
			getContainer().run(true, true,
					WizardTasks.operation(monitor -> file.create(content, IResource.FORCE, monitor)));
		} catch (InvocationTargetException e) {
			Tasks.show("The filter could not be made", e.getCause());
			return false;
		} catch (InterruptedException e) {
			return false; // cancelled by the person, who can change something and try again
		}
		WizardTasks.open(workbench, file);
		return true;
	}
}

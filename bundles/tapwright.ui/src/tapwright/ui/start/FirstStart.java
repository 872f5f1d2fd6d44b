// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.start;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IProjectDescription;
import org.eclipse.core.resources.IWorkspace;
import org.eclipse.core.resources.IWorkspaceRoot;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.resources.WorkspaceJob;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IPath;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.SubMonitor;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.ide.IDE;
import org.eclipse.ui.navigator.CommonNavigator;
import org.eclipse.ui.navigator.resources.ProjectExplorer;

import tapwright.core.portfolio.PortfolioFolder;
import tapwright.dsp.verify.Verdict;
import tapwright.ui.Tasks;
import tapwright.workspace.EvidenceListener;
import tapwright.workspace.PortfolioNature;
import tapwright.workspace.PortfolioProject;

/** Brings the portfolios of a folder into the workspace, in place, and opens the first filter with a problem when they are new. */
public final class FirstStart extends WorkspaceJob {

	private final Path folder;

	/**
	 * A job that is still to be scheduled.
	 *
	 * @param folder
	 *            holds a portfolio, or folders that do
	 */
	public FirstStart(Path folder) {
		super("Opening the portfolios in " + folder.getFileName());
		this.folder = folder;
		setRule(ResourcesPlugin.getWorkspace().getRoot());
	}

	@Override
	public IStatus runInWorkspace(IProgressMonitor monitor) throws CoreException {
		List<Path> found;
		try {
			found = portfolios();
		} catch (IOException e) {
			return Status.error(folder + " cannot be read: " + e.getMessage(), e);
		}
		if (found.isEmpty()) {
			return Status.error(folder + " holds no portfolio: neither it nor a folder in it has a file portfolio.tapwright.");
		}
		SubMonitor progress = SubMonitor.convert(monitor, found.size());
		for (Path portfolio : found) {
			open(portfolio, progress.split(1));
		}
		return Status.OK_STATUS;
	}

	private List<Path> portfolios() throws IOException {
		if (PortfolioFolder.isPortfolio(folder)) {
			return List.of(folder);
		}
		try (Stream<Path> children = Files.list(folder)) {
			return children.filter(PortfolioFolder::isPortfolio).sorted().toList();
		}
	}

	private static void open(Path portfolio, IProgressMonitor monitor) throws CoreException {
		IWorkspace workspace = ResourcesPlugin.getWorkspace();
		IWorkspaceRoot root = workspace.getRoot();
		if (root.findContainersForLocationURI(portfolio.toUri()).length > 0) {
			return; // it is there from an earlier start
		}
		SubMonitor progress = SubMonitor.convert(monitor, 3);
		Path description = portfolio.resolve(IProjectDescription.DESCRIPTION_FILE_NAME);
		IProjectDescription wanted = Files.exists(description)
				? workspace.loadProjectDescription(IPath.fromPath(description))
				: workspace.newProjectDescription(portfolio.getFileName().toString());
		IProject project = root.getProject(wanted.getName());
		if (project.exists()) {
			throw new CoreException(Status.error("The workspace has another portfolio named " + wanted.getName()
					+ "; rename it before " + portfolio + " is opened."));
		}
		wanted.setLocationURI(portfolio.toUri());
		openWhenVerified(project);
		project.create(wanted, progress.split(1));
		project.open(progress.split(1));
		PortfolioNature.addTo(project, progress.split(1));
	}

	private static void openWhenVerified(IProject project) {
		PortfolioProject.addListener(new EvidenceListener() {
			@Override
			public void evidenceChanged(PortfolioProject portfolio) {
				if (portfolio.project().equals(project) && !portfolio.evidence().isEmpty()) {
					PortfolioProject.removeListener(this);
					PlatformUI.getWorkbench().getDisplay().asyncExec(() -> openFirstProblem(portfolio));
				}
			}
		});
	}

	private static void openFirstProblem(PortfolioProject portfolio) {
		IWorkbenchWindow window = PlatformUI.getWorkbench().getActiveWorkbenchWindow();
		IWorkbenchPage page = window == null ? null : window.getActivePage();
		if (page == null) {
			return; // the window was closed in between
		}
		if (page.findView(ProjectExplorer.VIEW_ID) instanceof CommonNavigator explorer) {
			explorer.getCommonViewer().expandToLevel(portfolio.project(), 1);
		}
		if (page.getActiveEditor() != null) {
			return; // the person has begun something already
		}
		List<IFile> wrong = new ArrayList<>(portfolio.evidence().stream()
				.filter(found -> found.evidence().evidence().verdict() == Verdict.MISSED).map(PortfolioProject.FileEvidence::file)
				.toList());
		wrong.addAll(portfolio.filterFiles());
		try {
			if (!wrong.isEmpty()) {
				IDE.openEditor(page, wrong.getFirst());
			}
		} catch (PartInitException e) {
			Tasks.show(wrong.getFirst().getName() + " could not be opened", e);
		}
	}
}

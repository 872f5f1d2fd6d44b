// SPDX-License-Identifier: EPL-2.0
package tapwright.testing;

import java.util.UUID;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IFolder;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IWorkspace;
import org.eclipse.core.resources.IWorkspaceDescription;
import org.eclipse.core.resources.IncrementalProjectBuilder;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.emf.ecore.EObject;
import org.junit.jupiter.api.extension.AfterEachCallback;
import org.junit.jupiter.api.extension.BeforeEachCallback;
import org.junit.jupiter.api.extension.ExtensionContext;

import tapwright.model.io.ModelFiles;
import tapwright.workspace.PortfolioNature;

/** A workspace that is empty before and after each test and builds only when told to. */
public final class WorkspaceExtension implements BeforeEachCallback, AfterEachCallback {

	private final IWorkspace workspace = ResourcesPlugin.getWorkspace();

	@Override
	public void beforeEach(ExtensionContext context) throws CoreException {
		setAutoBuilding(false);
		workspace.getRoot().delete(true, true, null);
	}

	@Override
	public void afterEach(ExtensionContext context) throws CoreException {
		setAutoBuilding(false);
		workspace.getRoot().delete(true, true, null);
	}

	/** Turns building after each change on or off. */
	public void setAutoBuilding(boolean on) throws CoreException {
		IWorkspaceDescription description = workspace.getDescription();
		description.setAutoBuilding(on);
		workspace.setDescription(description);
	}

	/** A new, open portfolio project without files. */
	public IProject portfolioProject() throws CoreException {
		IProject project = workspace.getRoot().getProject("marram-" + UUID.randomUUID());
		project.create(null);
		project.open(null);
		PortfolioNature.addTo(project, null);
		return project;
	}

	/** Writes a model object to a file, new or not, with the folders that it needs. */
	public IFile write(IProject project, String path, EObject root) throws CoreException {
		return write(project, path, ModelFiles.toBytes(root));
	}

	/** Writes a file, new or not, with the folders that it needs. */
	public IFile write(IProject project, String path, byte[] content) throws CoreException {
		IFile file = project.getFile(path);
		if (file.getParent() instanceof IFolder folder && !folder.exists()) {
			folder.create(true, true, null);
		}
		file.write(content, true, false, false, null);
		return file;
	}

	/** Lets all builders see what changed since the last time. */
	public void build(IProject project) throws CoreException {
		project.build(IncrementalProjectBuilder.INCREMENTAL_BUILD, null);
	}

	/** Lets all builders start afresh. */
	public void cleanBuild(IProject project) throws CoreException {
		project.build(IncrementalProjectBuilder.CLEAN_BUILD, null);
		project.build(IncrementalProjectBuilder.FULL_BUILD, null);
	}

	/** Reads the disk again. */
	public void refresh(IProject project) throws CoreException {
		project.refreshLocal(IResource.DEPTH_INFINITE, null);
	}
}

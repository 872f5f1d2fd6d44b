// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace.internal;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

import org.eclipse.core.resources.IContainer;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.CoreException;

import tapwright.core.portfolio.PortfolioFolder;
import tapwright.model.io.ModelFiles;

/** Which resources are present filters. */
public final class FilterFiles {

	private FilterFiles() {
	}

	/** The filter files of a project in the order of their paths. */
	public static List<IFile> in(IProject project) throws CoreException {
		var files = new ArrayList<IFile>();
		project.accept(proxy -> {
			if (proxy.getType() == IResource.FILE) {
				if (isFilterName(proxy.getName())) {
					files.add((IFile) proxy.requestResource());
				}
				return false;
			}
			return proxy.getType() == IResource.PROJECT || PortfolioFolder.isPresent(Path.of(proxy.getName()));
		}, IResource.NONE);
		files.sort(Comparator.comparing(FilterFiles::path));
		return files;
	}

	/** Whether a resource is a present filter file. */
	public static boolean isFilter(IResource resource) {
		return resource.getType() == IResource.FILE && isFilterName(resource.getName()) && isPresent(resource.getParent());
	}

	/** Whether a resource is the root file of a portfolio. */
	public static boolean isRoot(IResource resource) {
		return resource.getType() == IResource.FILE && resource.getParent().getType() == IResource.PROJECT
				&& resource.getName().equals(ModelFiles.PORTFOLIO_FILE);
	}

	/** Whether a folder can hold present filters. */
	static boolean isPresent(IContainer container) {
		for (IContainer folder = container; folder.getType() == IResource.FOLDER; folder = folder.getParent()) {
			if (!PortfolioFolder.isPresent(Path.of(folder.getName()))) {
				return false;
			}
		}
		return true;
	}

	/** The path of a file in its project, as the core knows it. */
	public static String path(IFile file) {
		return file.getProjectRelativePath().toString();
	}

	private static boolean isFilterName(String name) {
		return name.endsWith("." + ModelFiles.FILTER_EXTENSION) && !name.startsWith(".");
	}
}

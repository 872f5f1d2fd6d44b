// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.util.List;

import org.eclipse.core.resources.IProject;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IPath;

import tapwright.core.portfolio.PortfolioContent;

/** The files of a project as they are on disk. */
record ProjectContent(IProject project) implements PortfolioContent {

	@Override
	public List<String> filters() throws IOException {
		try {
			return FilterFiles.in(project).stream().map(FilterFiles::path).toList();
		} catch (CoreException e) {
			throw new IOException(e);
		}
	}

	@Override
	public byte[] read(String path) throws IOException {
		IPath location = project.getFile(path).getLocation();
		if (location == null) {
			throw new IOException("it is not on a local disk");
		}
		return Files.readAllBytes(location.toPath());
	}
}

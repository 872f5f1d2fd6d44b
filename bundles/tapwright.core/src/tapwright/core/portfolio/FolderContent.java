// SPDX-License-Identifier: EPL-2.0
package tapwright.core.portfolio;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

import tapwright.model.io.ModelFiles;

/**
 * A portfolio as a folder on disk.
 *
 * @param folder
 *            with the root file
 */
public record FolderContent(Path folder) implements PortfolioContent {

	@Override
	public List<String> filters() throws IOException {
		return PortfolioFolder.files(folder, ModelFiles.FILTER_EXTENSION).stream()
				.map(file -> folder.relativize(file).toString().replace(File.separatorChar, '/')).toList();
	}

	@Override
	public byte[] read(String path) throws IOException {
		return Files.readAllBytes(folder.resolve(path));
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.core.portfolio;

import java.io.IOException;
import java.util.Collection;

/** The files of a portfolio by their paths in its folder, with '/' between the parts. Asked from several threads at once. */
public interface PortfolioContent {

	/** Paths of all present filter files. */
	Collection<String> filters() throws IOException;

	/**
	 * The bytes of a file.
	 *
	 * @throws java.nio.file.NoSuchFileException
	 *             when there is no such file
	 */
	byte[] read(String path) throws IOException;
}

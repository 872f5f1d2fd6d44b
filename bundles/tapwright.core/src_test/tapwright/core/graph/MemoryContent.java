// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.nio.charset.StandardCharsets;
import java.nio.file.NoSuchFileException;
import java.util.Collection;
import java.util.Map;
import java.util.TreeMap;

import tapwright.core.InputException;
import tapwright.core.interchange.FilterJson;
import tapwright.core.portfolio.PortfolioContent;
import tapwright.model.ModelFactory;
import tapwright.model.Parameter;
import tapwright.model.Portfolio;
import tapwright.model.io.ModelFiles;

/** A portfolio without a disk. */
final class MemoryContent implements PortfolioContent {

	private final Map<String, byte[]> files = new TreeMap<>();

	@Override
	public Collection<String> filters() {
		return files.keySet().stream().filter(path -> path.endsWith(".filter")).toList();
	}

	@Override
	public byte[] read(String path) throws NoSuchFileException {
		byte[] content = files.get(path);
		if (content == null) {
			throw new NoSuchFileException(path);
		}
		return content;
	}

	/** Writes the root file; name, value, name, value, ... */
	void parameters(String... namesAndValues) {
		Portfolio portfolio = ModelFactory.eINSTANCE.createPortfolio();
		for (int k = 0; k < namesAndValues.length; k += 2) {
			Parameter parameter = ModelFactory.eINSTANCE.createParameter();
			parameter.setName(namesAndValues[k]);
			parameter.setValue(namesAndValues[k + 1]);
			portfolio.getParameters().add(parameter);
		}
		files.put(ModelFiles.PORTFOLIO_FILE, ModelFiles.toBytes(portfolio));
	}

	/** Writes a filter given by members of the interchange format. */
	void filter(String path, String members) throws InputException {
		files.put(path, ModelFiles.toBytes(FilterJson.read("{\"format\": \"tapwright-filter/1\", " + members + "}")));
	}

	void text(String path, String text) {
		files.put(path, text.getBytes(StandardCharsets.UTF_8));
	}

	void remove(String path) {
		files.remove(path);
	}

	void move(String from, String to) {
		files.put(to, files.remove(from));
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;

import tapwright.core.InputException;
import tapwright.core.portfolio.FilePartners;
import tapwright.core.portfolio.PortfolioFolder;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.model.Arithmetic;
import tapwright.model.Filter;
import tapwright.model.Format;
import tapwright.model.GivenDesign;
import tapwright.model.IntegerCoefficients;
import tapwright.model.ModelFactory;
import tapwright.model.Portfolio;
import tapwright.model.RealCoefficients;
import tapwright.model.io.ModelFiles;

/**
 * The filters that an import would make, complete before the first is written. Confined to one thread, like the model objects
 * that it holds.
 *
 * @param filters
 *            in the order of files and arrays
 * @param skipped
 *            files of folders in which no coefficients were found
 */
public record ImportPlan(List<Planned> filters, List<Path> skipped) {

	/**
	 * One filter to be made.
	 *
	 * @param file
	 *            where it was found
	 * @param fileName
	 *            name of the filter file
	 * @param filter
	 *            its content
	 * @param table
	 *            the array, when it was one
	 */
	public record Planned(Path file, String fileName, Filter filter, Optional<ImportedTable> table) {
	}

	/**
	 * Reads files, and the usual files of folders and all folders below.
	 *
	 * @throws InputException
	 *             when any of them cannot be used, with file, line, column and reason
	 */
	public static ImportPlan of(List<Path> paths, ImportOptions options) throws InputException, IOException {
		var taken = new TreeMap<String, Path>();
		var filters = new ArrayList<Planned>();
		var skipped = new ArrayList<Path>();
		for (Path path : paths) {
			boolean folder = Files.isDirectory(path);
			if (!folder && !Files.isRegularFile(path)) {
				throw new InputException(path.toString(), "there is no such file or folder");
			}
			for (Path file : folder ? usual(path) : List.of(path)) {
				if (Files.size(file) > ImportedFile.LARGEST) {
					throw new InputException(file.toString(), "is too large for a file of coefficients");
				}
				ImportedFile found = ImportedFile.read(file.toString(), Files.readAllBytes(file), options);
				if (found.filter().isEmpty() && found.tables().isEmpty()) {
					if (!folder) {
						throw new InputException(file.toString(), "holds no array of numbers, read as " + found.format()
								.label()
								+ "; state the format if it is another");
					}
					skipped.add(file);
				}
				add(file, found, options, taken, filters);
			}
		}
		if (filters.isEmpty()) {
			throw new InputException("", "no coefficients were found");
		}
		return new ImportPlan(List.copyOf(filters), List.copyOf(skipped));
	}

	/**
	 * Writes all filter files, or none.
	 *
	 * @param folder
	 *            is made when it does not exist; gets a portfolio file when it belongs to no portfolio
	 * @throws InputException
	 *             when a file of that name exists
	 */
	public List<Path> write(Path folder) throws InputException, IOException {
		for (Planned planned : filters) {
			if (Files.exists(folder.resolve(planned.fileName()))) {
				throw new InputException(folder.resolve(planned.fileName()).toString(),
						"exists already; nothing was imported");
			}
		}
		var written = new ArrayList<Path>();
		boolean complete = false;
		try {
			if (PortfolioFolder.above(folder).isEmpty()) {
				Portfolio portfolio = ModelFactory.eINSTANCE.createPortfolio();
				portfolio.setName(folder.toAbsolutePath().normalize().getFileName().toString());
				ModelFiles.save(portfolio, folder.resolve(ModelFiles.PORTFOLIO_FILE));
				written.add(folder.resolve(ModelFiles.PORTFOLIO_FILE));
			}
			for (Planned planned : filters) {
				ModelFiles.save(planned.filter(), folder.resolve(planned.fileName()));
				written.add(folder.resolve(planned.fileName()));
			}
			complete = true;
		} finally {
			if (!complete) {
				for (Path file : written) {
					Files.deleteIfExists(file);
				}
			}
		}
		return written;
	}

	private static List<Path> usual(Path folder) throws IOException {
		try (Stream<Path> files = Files.walk(folder)) {
			return files.filter(Files::isRegularFile)
					.filter(file -> ImportFormat.isUsual(file.getFileName().toString())).sorted().toList();
		}
	}

	private static void add(Path file, ImportedFile found, ImportOptions options, TreeMap<String, Path> taken,
			List<Planned> into) {
		String base = FilePartners.nameOf(file.getFileName().toString());
		if (found.filter().isPresent()) {
			Filter filter = found.filter().get();
			filter.setName(filter.getName() == null ? base : filter.getName());
			into.add(new Planned(file, fileName(filter.getName(), file, taken), filter, Optional.empty()));
		}
		for (ImportedTable table : found.tables()) {
			String name = table.name().isEmpty() || table.name().equals("integer") ? base
					: table.name().startsWith("column ") || table.name().startsWith("channel ") ? base + " "
							+ table.name() : table.name();
			Filter filter = filter(name, file, table, options);
			into.add(new Planned(file, fileName(name, file, taken), filter, Optional.of(table)));
		}
	}

	private static String fileName(String name, Path file, TreeMap<String, Path> taken) {
		String stem = name.toLowerCase(Locale.ROOT).replaceAll("[^a-z0-9]+", "-").replaceAll("^-+|-+$", "");
		String fileName = (stem.isEmpty() ? "filter" : stem) + "." + ModelFiles.FILTER_EXTENSION;
		for (int k = 2; taken.containsKey(fileName); k++) {
			fileName = (stem.isEmpty() ? "filter" : stem) + "-" + k + "." + ModelFiles.FILTER_EXTENSION;
		}
		taken.put(fileName, file);
		return fileName;
	}

	private static Filter filter(String name, Path file, ImportedTable table, ImportOptions options) {
		Filter filter = ModelFactory.eINSTANCE.createFilter();
		filter.setName(name);
		table.sampleRate().ifPresent(rate -> filter.setSampleRate(number(rate)));
		options.sampleRate().ifPresent(rate -> filter.setSampleRate(number(rate)));
		GivenDesign design = ModelFactory.eINSTANCE.createGivenDesign();
		design.setSource(file.getFileName() + (table.name().isEmpty() ? "" : ", " + table.name())
				+ (table.line() > 0 ? ", line " + table.line() : ""));
		filter.setDesign(design);
		if (table.isWhole()) {
			NumberFormat format = table.format().orElseThrow();
			IntegerCoefficients coefficients = ModelFactory.eINSTANCE.createIntegerCoefficients();
			coefficients.getIntegers().addAll(table.integers());
			coefficients.setScale("2^" + -format.fraction());
			filter.setCoefficients(coefficients);
			Format stated = ModelFactory.eINSTANCE.createFormat();
			stated.setWord(String.valueOf(format.word()));
			stated.setFraction(String.valueOf(format.fraction()));
			stated.setSigned(format.signed());
			Arithmetic arithmetic = ModelFactory.eINSTANCE.createArithmetic();
			arithmetic.setCoefficient(stated);
			filter.setArithmetic(arithmetic);
		} else {
			RealCoefficients coefficients = ModelFactory.eINSTANCE.createRealCoefficients();
			coefficients.getValues().addAll(table.values());
			filter.setCoefficients(coefficients);
		}
		return filter;
	}

	private static String number(double value) {
		return value == Math.rint(value) && Math.abs(value) < 1e15 ? String.valueOf((long) value)
				: String.valueOf(value);
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.model.io;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.math.BigInteger;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

import org.eclipse.emf.common.util.URI;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

import tapwright.model.Filter;
import tapwright.model.GainRequirement;
import tapwright.model.IntegerCoefficients;
import tapwright.model.ModelFactory;
import tapwright.model.Portfolio;
import tapwright.model.RealCoefficients;

class ModelFilesTest {

	@TempDir
	Path folder;

	@Test
	void writesOneAttributeOrValuePerLine() {
		String expected = """
				<?xml version="1.0" encoding="UTF-8"?>
				<tapwright:Filter
				    xmi:version="2.0"
				    xmlns:xmi="http://www.omg.org/XMI"
				    xmlns:xsi="http://www.w3.org/2001/XMLSchema-instance"
				    xmlns:tapwright="urn:tapwright:1"
				    name="wave smoother"
				    sampleRate="50">
				  <requirements
				      xsi:type="tapwright:GainRequirement"
				      id="stop"
				      from="0.4 * rate"
				      max="-40"/>
				  <coefficients
				      xsi:type="tapwright:RealCoefficients">
				    <values>0.1</values>
				    <values>1.0E-5</values>
				    <values>0.1</values>
				  </coefficients>
				</tapwright:Filter>
				""";
		assertEquals(expected, new String(ModelFiles.toBytes(smoother()), StandardCharsets.UTF_8));
	}

	@Test
	void givesTheSameBytesAfterLoadAndSave() throws IOException {
		Path file = folder.resolve("wave smoother.filter");
		ModelFiles.save(smoother(), file);
		byte[] first = Files.readAllBytes(file);
		ModelFiles.save(ModelFiles.load(file, Filter.class), file);
		assertArrayEquals(first, Files.readAllBytes(file));
	}

	@Test
	void keepsEqualIntegersApart() throws IOException {
		Filter filter = ModelFactory.eINSTANCE.createFilter();
		IntegerCoefficients coefficients = ModelFactory.eINSTANCE.createIntegerCoefficients();
		coefficients.getIntegers().addAll(List.of(BigInteger.TWO, BigInteger.TEN, BigInteger.TWO));
		coefficients.setScale("2^-15");
		filter.setCoefficients(coefficients);
		Filter read = ModelFiles.parse(ModelFiles.toBytes(filter), "x", Filter.class);
		assertEquals(List.of(BigInteger.TWO, BigInteger.TEN, BigInteger.TWO),
				((IntegerCoefficients) read.getCoefficients()).getIntegers());
	}

	@Test
	void namesAnUnknownAttributeWithItsLine() {
		ModelFileException problem = rejects(text().replace("sampleRate=", "samplRate="));
		assertTrue(problem.reason().contains("'samplRate' is not known in Filter"), problem.getMessage());
		assertEquals(8, problem.line());
	}

	@Test
	void namesAnUnknownElementWithItsLine() {
		ModelFileException problem = rejects(text().replace("    <values>0.1</values>\n    <values>1", "    <extra/>\n    <values>1"));
		assertTrue(problem.reason().contains("'extra' is not known"), problem.getMessage());
		assertEquals(16, problem.line());
	}

	@Test
	void namesAnUnknownKindOfRequirement() {
		ModelFileException problem = rejects(text().replace("GainRequirement", "CharmRequirement"));
		assertTrue(problem.reason().contains("CharmRequirement"), problem.getMessage());
	}

	@Test
	void namesAValueThatIsNoNumber() {
		ModelFileException problem = rejects(text().replace("1.0E-5", "O.1"));
		assertTrue(problem.reason().contains("'O.1'") && problem.reason().contains("values"), problem.getMessage());
		assertEquals(17, problem.line());
	}

	@Test
	void refusesCommentsBecauseSavingWouldDropThem() {
		ModelFileException problem = rejects(text().replace("  <coefficients", "  <!-- mine -->\n  <coefficients"));
		assertTrue(problem.reason().contains("comments would be lost"), problem.getMessage());
		assertEquals(14, problem.line());
	}

	@Test
	void refusesAnotherVersionOfTheFormat() {
		ModelFileException problem = rejects(text().replace("urn:tapwright:1", "urn:tapwright:2"));
		assertTrue(problem.reason().contains("newer version"), problem.getMessage());
	}

	@Test
	void refusesDocumentTypesThatCouldReadOtherFiles() {
		rejects(text().replace("<tapwright:Filter\n", "<!DOCTYPE x [<!ENTITY e SYSTEM \"file:///etc/passwd\">]>\n<tapwright:Filter\n"));
	}

	@Test
	void saysWhereAFileThatEndsTooEarlyBreaks() {
		ModelFileException problem = rejects(text().substring(0, text().indexOf("</coefficients>")));
		assertTrue(problem.line() >= 18, problem.getMessage());
	}

	@Test
	void refusesARootOfAnotherKind() {
		byte[] content = ModelFiles.toBytes(ModelFactory.eINSTANCE.createPortfolio());
		assertThrows(ModelFileException.class, () -> ModelFiles.parse(content, "x.filter", Filter.class));
	}

	@Test
	void leavesTheTargetAloneWhenWritingFails() throws IOException {
		Path target = Files.createDirectory(folder.resolve("occupied.filter"));
		Files.writeString(target.resolve("inside"), "kept");
		assertThrows(IOException.class, () -> AtomicFiles.write(target, new byte[] { 1 }));
		assertEquals("kept", Files.readString(target.resolve("inside")));
		try (var files = Files.list(folder)) {
			assertEquals(List.of(target), files.toList());
		}
	}

	@Test
	void doesNotTakeAnObjectOutOfItsResource() {
		Portfolio portfolio = ModelFactory.eINSTANCE.createPortfolio();
		var resource = new ModelResource(URI.createURI("memory:/x"));
		resource.getContents().add(portfolio);
		ModelFiles.toBytes(portfolio);
		assertEquals(resource, portfolio.eResource());
	}

	private static ModelFileException rejects(String text) {
		return assertThrows(ModelFileException.class,
				() -> ModelFiles.parse(text.getBytes(StandardCharsets.UTF_8), "x.filter", Filter.class));
	}

	private static String text() {
		return new String(ModelFiles.toBytes(smoother()), StandardCharsets.UTF_8);
	}

	private static Filter smoother() {
		Filter filter = ModelFactory.eINSTANCE.createFilter();
		filter.setName("wave smoother");
		filter.setSampleRate("50");
		GainRequirement stop = ModelFactory.eINSTANCE.createGainRequirement();
		stop.setId("stop");
		stop.setFrom("0.4 * rate");
		stop.setMax("-40");
		filter.getRequirements().add(stop);
		RealCoefficients coefficients = ModelFactory.eINSTANCE.createRealCoefficients();
		coefficients.getValues().addAll(List.of(0.1, 1e-5, 0.1));
		filter.setCoefficients(coefficients);
		return filter;
	}
}

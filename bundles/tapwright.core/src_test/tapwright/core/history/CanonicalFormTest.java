// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.math.BigInteger;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;

import org.junit.jupiter.api.Test;

import tapwright.model.Evidence;
import tapwright.model.Filter;
import tapwright.model.IntegerCoefficients;
import tapwright.model.ModelFactory;
import tapwright.model.Result;
import tapwright.model.Revision;
import tapwright.model.Verdict;
import tapwright.model.io.ModelFiles;

class CanonicalFormTest {

	/** Written by hand from the specification in the Javadoc of the class, not by the program. */
	private static final String GOLDEN = """
			tapwright-canonical/1
			(Revision
			author 1
			s 5 Jörg
			evidence 1
			(Evidence
			results 1
			(Result
			limit 1
			d c034000000000000
			marginLow 1
			d 7ff8000000000000
			)
			verdict 1
			e missed
			)
			filter 1
			(Filter
			coefficients 1
			(IntegerCoefficients
			integers 3
			i -1
			i 0
			i 36893488147419103232
			)
			name 1
			s 3 a
			b
			)
			parents 2
			s 2 00
			s 1 f
			)
			""";

	@Test
	void hasExactlyTheBytesThatItsSpecificationSays() {
		assertEquals(GOLDEN, new String(CanonicalForm.of(revision()), StandardCharsets.UTF_8));
	}

	@Test
	void hashIsSha256OfTheBytes() {
		// SHA-256 of the text above by sha256sum of GNU coreutils 9.1
		assertEquals("20550b352a160531f6f8f013e1a9b5203840dab1e5e0d4fd35878daaf97f3770", CanonicalForm.hash(revision()));
	}

	@Test
	void doesNotDependOnTheLocale() {
		Locale before = Locale.getDefault();
		try {
			Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
			assertEquals(GOLDEN, new String(CanonicalForm.of(revision()), StandardCharsets.UTF_8));
		} finally {
			Locale.setDefault(before);
		}
	}

	@Test
	void doesNotDependOnTheLayoutOfTheFile() throws Exception {
		Revision revision = revision();
		revision.setMessage("two\nlines \t & <more> \u20ac \ud83d\ude00");
		String text = new String(ModelFiles.toBytes(revision), StandardCharsets.UTF_8);
		String other = text.replace("\n    ", " ").replace("\n", "\r\n");
		assertNotEquals(text, other);
		Revision read = ModelFiles.parse(other.getBytes(StandardCharsets.UTF_8), "r", Revision.class);
		assertEquals(CanonicalForm.hash(revision), CanonicalForm.hash(read));
	}

	@Test
	void tellsApartWhatDiffersInOneBit() {
		Revision revision = revision();
		revision.getEvidence().getResults().getFirst().setLimit(Math.nextUp(-20.0));
		assertNotEquals(CanonicalForm.hash(revision()), CanonicalForm.hash(revision));
	}

	@Test
	void refusesHalfOfACharacter() {
		Revision revision = revision();
		revision.setMessage("\ud83d");
		assertThrows(IllegalArgumentException.class, () -> CanonicalForm.hash(revision));
	}

	private static Revision revision() {
		Revision revision = ModelFactory.eINSTANCE.createRevision();
		revision.getParents().addAll(List.of("00", "f"));
		revision.setAuthor("J\u00f6rg");
		Filter filter = ModelFactory.eINSTANCE.createFilter();
		filter.setName("a\nb");
		IntegerCoefficients coefficients = ModelFactory.eINSTANCE.createIntegerCoefficients();
		coefficients.getIntegers().addAll(List.of(BigInteger.ONE.negate(), BigInteger.ZERO, BigInteger.TWO.pow(65)));
		filter.setCoefficients(coefficients);
		revision.setFilter(filter);
		Evidence evidence = ModelFactory.eINSTANCE.createEvidence();
		evidence.setVerdict(Verdict.MISSED);
		Result result = ModelFactory.eINSTANCE.createResult();
		result.setLimit(-20);
		result.setMarginLow(Double.NaN);
		evidence.getResults().add(result);
		revision.setEvidence(evidence);
		return revision;
	}
}

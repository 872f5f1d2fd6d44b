// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange;

import java.math.BigInteger;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.IntStream;

import tapwright.core.InputException;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.verify.Subject;
import tapwright.model.Filter;
import tapwright.model.IntegerCoefficients;

/**
 * One filter as it is handed to others: the numbers that ship, and what a reader should know of them. Immutable.
 *
 * @param name
 *            of the filter
 * @param revision
 *            hash of the recorded revision with this content; empty when there is none
 * @param requirements
 *            one line for each
 * @param taps
 *            the coefficients that ship
 * @param sampleRate
 *            hertz
 * @param arithmetic
 *            structure and formats, when stated
 * @param whole
 *            whether the coefficients are whole numbers of steps that a person chose, by a format or by storing integers
 */
public record HandOver(String name, String revision, List<String> requirements, ExactTaps taps, double sampleRate,
		Optional<Arithmetic> arithmetic, boolean whole) {

	/** Takes a copy. */
	public HandOver {
		requirements = List.copyOf(requirements);
	}

	/**
	 * Takes the numbers from a filter.
	 *
	 * @param question
	 *            made of the filter
	 * @param evidence
	 *            what was proven of it
	 * @param revision
	 *            hash of the recorded revision with this content; empty when there is none
	 * @throws InputException
	 *             when there are no usable coefficients
	 */
	public static HandOver of(Filter filter, FilterQuestion question, FilterEvidence evidence, String revision)
			throws InputException {
		if (question.subject().isEmpty()) {
			throw new InputException(question.name(), filter.getCoefficients() == null
					? "there are no coefficients; design or import them"
					: evidence.problems().isEmpty() ? "the coefficients cannot be used" : evidence.problems().getFirst()
							.describe());
		}
		Subject subject = question.subject().get();
		boolean whole = filter.getCoefficients() instanceof IntegerCoefficients
				|| subject.arithmetic().flatMap(Arithmetic::coefficient).isPresent();
		List<String> requirements = evidence.requirements().stream()
				.map(requirement -> requirement.proof().verdict().name().toLowerCase(Locale.ROOT) + ": "
						+ requirement.message())
				.toList();
		return new HandOver(question.name(), revision, requirements, subject.taps(), subject.sampleRate(),
				subject.arithmetic(),
				whole);
	}

	/** The coefficients as integers times {@link ExactTaps#unit()}: in steps of their format where there is one. */
	public ExactTaps stored() {
		return arithmetic.map(formats -> formats.stored(taps)).orElse(taps);
	}

	/**
	 * The format that holds the integers: the stated one, otherwise the shortest signed word, without a binary point.
	 *
	 * @throws InputException
	 *             when the coefficients are not whole numbers of steps
	 */
	public NumberFormat word() throws InputException {
		Optional<NumberFormat> stated = arithmetic.flatMap(Arithmetic::coefficient);
		if (stated.isPresent()) {
			return stated.get();
		}
		if (!whole) {
			throw new InputException(name, "the coefficients are real numbers; state a coefficient format in the arithmetic to export words");
		}
		int bits = integers().stream().mapToInt(integer -> integer.bitLength() + 1).max().orElse(1);
		if (bits > NumberFormat.MAX_WORD) {
			throw new InputException(name, "a coefficient needs " + bits + " bits; words have at most "
					+ NumberFormat.MAX_WORD);
		}
		return new NumberFormat(bits, 0);
	}

	/** The integers of {@link #stored()}. */
	public List<BigInteger> integers() {
		ExactTaps stored = stored();
		return IntStream.range(0, stored.length()).mapToObj(stored::integer).toList();
	}

	/** SHA-256 of everything that acts on a signal: coefficients, sample rate, structure and formats, in hexadecimal digits. */
	public String numbersHash() {
		var text = new StringBuilder("rate ").append(sampleRate).append('\n');
		arithmetic.ifPresent(formats -> text.append(formats).append('\n'));
		// The value counts, not how it is split into integer and unit.
		for (int k = 0; k < taps.length(); k++) {
			text.append(taps.tap(k).getNumerator()).append('/').append(taps.tap(k).getDenominator()).append('\n');
		}
		return Stamp.sha256(text.toString().getBytes(StandardCharsets.UTF_8));
	}

	/** The stated formats, one line for each; empty without arithmetic. */
	public List<String> formats() {
		var lines = new ArrayList<String>();
		arithmetic.ifPresent(formats -> {
			lines.add("structure " + words(formats.structure())
					+ (formats.factor() > 1 ? ", factor " + formats.factor() : ""));
			formats.coefficient().ifPresent(format -> lines.add("coefficients " + format.text()));
			formats.input().ifPresent(format -> lines.add("input " + format.text()));
			formats.product().ifPresent(format -> lines.add("products " + format.text()));
			formats.accumulator().ifPresent(format -> lines.add("accumulator " + format.text()));
			formats.output().ifPresent(format -> lines.add("output " + format.text()));
			lines.add("rounding " + words(formats.rounding()) + ", overflow " + words(formats.overflow()));
		});
		return lines;
	}

	private static String words(Enum<?> choice) {
		return choice.name().toLowerCase(Locale.ROOT).replace('_', '-');
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

import java.math.BigInteger;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Arrays;
import java.util.HexFormat;
import java.util.List;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Numbers;
import tapwright.dsp.Progress;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.design.special.ExactDesign;
import tapwright.dsp.exact.ExactTaps;
import tapwright.model.Coefficients;
import tapwright.model.Filter;
import tapwright.model.IntegerCoefficients;
import tapwright.model.ModelFactory;
import tapwright.model.ModelPackage;
import tapwright.model.RealCoefficients;

/**
 * A design that is ready to run: taken from the model on the thread that owns it, run on any thread.
 *
 * @param method
 *            the method with all its numbers
 */
public record Designer(Design method) {

	private static final int HASH_DIGITS = 12;
	private static final int LONGEST_DENOMINATOR = 200; // bits

	/**
	 * Coefficients and what a person should know of them.
	 *
	 * @param coefficients
	 *            new model object
	 * @param notes
	 *            whole sentences
	 */
	public record Outcome(Coefficients coefficients, List<String> notes) {
	}

	/**
	 * The design of a filter; nothing when its coefficients were made elsewhere.
	 *
	 * @throws InputException
	 *             when a number is missing or makes no sense
	 */
	public static Optional<Designer> of(Filter filter, Expression.Names parameters) throws InputException {
		if (filter.getDesign() == null) {
			return Optional.empty();
		}
		var numbers = new Numbers(parameters);
		double rate = numbers.get(filter, ModelPackage.Literals.FILTER__SAMPLE_RATE);
		return DesignKinds.method(filter.getDesign(), new DesignInput(filter, rate, numbers)).map(Designer::new);
	}

	/** Identifies the method with all its numbers: coefficients that carry another one were made by another design. */
	public String hash() {
		try {
			byte[] digest = MessageDigest.getInstance("SHA-256").digest(method.toString().getBytes(StandardCharsets.UTF_8));
			return HexFormat.of().formatHex(digest).substring(0, HASH_DIGITS);
		} catch (NoSuchAlgorithmException e) {
			throw new IllegalStateException("every Java platform has SHA-256", e);
		}
	}

	/**
	 * Computes the coefficients.
	 *
	 * @throws DesignException
	 *             when there are none; says why and what to do
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	public Outcome run(Progress progress) throws DesignException {
		Outcome outcome = method instanceof ExactDesign exact ? exact(exact.exact(progress)) : reals(method.compute(progress));
		outcome.coefficients().setDesignHash(hash());
		return outcome;
	}

	private static Outcome reals(DesignResult result) {
		RealCoefficients coefficients = ModelFactory.eINSTANCE.createRealCoefficients();
		coefficients.getValues().addAll(Arrays.stream(result.taps()).boxed().toList());
		return new Outcome(coefficients, result.notes());
	}

	// Rationals are kept as they are, unless nobody could read them.
	private static Outcome exact(ExactTaps taps) {
		BigInteger denominator = taps.unit().getDenominator();
		boolean powerOfTwo = denominator.bitCount() == 1 && taps.unit().getNumerator().equals(BigInteger.ONE);
		if (denominator.bitLength() > LONGEST_DENOMINATOR) {
			return reals(new DesignResult(taps.toDoubles()));
		}
		return new Outcome(integers(taps, powerOfTwo ? "2^-" + (denominator.bitLength() - 1)
				: taps.unit().getNumerator() + "/" + denominator), List.of());
	}

	private static IntegerCoefficients integers(ExactTaps taps, String scale) {
		IntegerCoefficients coefficients = ModelFactory.eINSTANCE.createIntegerCoefficients();
		for (int k = 0; k < taps.length(); k++) {
			coefficients.getIntegers().add(taps.integer(k));
		}
		coefficients.setScale(scale);
		return coefficients;
	}
}

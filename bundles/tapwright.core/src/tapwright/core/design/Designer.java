// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

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
import tapwright.model.Filter;
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

	/**
	 * Coefficients and what a person should know of them.
	 *
	 * @param coefficients
	 *            new model object
	 * @param notes
	 *            whole sentences
	 */
	public record Outcome(RealCoefficients coefficients, List<String> notes) {
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
		DesignResult result = method.compute(progress);
		RealCoefficients coefficients = ModelFactory.eINSTANCE.createRealCoefficients();
		coefficients.getValues().addAll(Arrays.stream(result.taps()).boxed().toList());
		coefficients.setDesignHash(hash());
		return new Outcome(coefficients, result.notes());
	}
}

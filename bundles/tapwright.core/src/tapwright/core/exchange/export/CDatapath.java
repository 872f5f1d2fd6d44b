// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import java.math.BigInteger;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.core.InputException;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.Datapath;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.arithmetic.Overflow;
import tapwright.dsp.arithmetic.Requantizer;
import tapwright.dsp.arithmetic.Term;
import tapwright.dsp.exact.ExactTaps;

/**
 * The steps from a product to an output as C expressions over signed 64-bit integers. Every number on the way is bounded first; a
 * filter that could leave 64 bits is refused. Rounding and overflow are left out where the bound proves that they do nothing.
 */
final class CDatapath {

	private static final String NO_ROOM = " bits; the routine computes with 64";

	private final Overflow overflow;
	private final Datapath path;
	private final String product;
	private final String sum;
	private final String output;
	private final String outputType;
	private boolean rounds;
	private boolean saturates;
	private boolean wrapsSigned;
	private boolean wrapsUnsigned;

	/** An expression and a bound of its size. */
	private record Node(String code, BigInteger size) {
	}

	CDatapath(ExactTaps taps, Arithmetic arithmetic) throws InputException {
		overflow = arithmetic.overflow();
		ExactTaps stored = arithmetic.stored(taps);
		path = Datapath.of(taps, arithmetic);
		BigInteger sample = path.input().max().max(path.input().min().negate());
		check(sample.shiftLeft(1), "the sum of two input samples");
		BigInteger largestCoefficient = BigInteger.ZERO;
		BigInteger largestExact = BigInteger.ZERO;
		for (int phase = 0; phase < arithmetic.interpolation(); phase++) {
			for (Term term : arithmetic.terms(taps, phase)) {
				BigInteger size = stored.integer(term.tap()).abs();
				largestCoefficient = largestCoefficient.max(size);
				largestExact = largestExact.max(size.multiply(term.isFolded() ? sample.shiftLeft(1) : sample));
			}
		}
		check(largestCoefficient, "a coefficient");
		check(largestExact, "a product");
		Node rounded = step(path.product(), new Node("coefficient * sample", largestExact), "a product");
		Node aligned = step(path.align(), rounded, "a product in steps of the accumulator");
		product = aligned.code;
		BigInteger total = total(taps, stored, arithmetic, sample, aligned.size);
		Node added = sum(arithmetic.accumulator(), aligned.size, total);
		sum = added.code;
		Node finished = step(path.output(), new Node("sum", added.size), "an output");
		output = finished.code;
		outputType = arithmetic.output().isPresent() ? CTypes.type(arithmetic.output().get(), "output samples")
				: "int64_t";
	}

	// A bound of the sum of all products, one by one, so that small coefficients count little.
	private BigInteger total(ExactTaps taps, ExactTaps stored, Arithmetic arithmetic, BigInteger sample,
			BigInteger most) {
		BigInteger largest = BigInteger.ZERO;
		for (int phase = 0; phase < arithmetic.interpolation(); phase++) {
			BigInteger sum = BigInteger.ZERO;
			for (Term term : arithmetic.terms(taps, phase)) {
				BigInteger exact = stored.integer(term.tap()).abs()
						.multiply(term.isFolded() ? sample.shiftLeft(1) : sample);
				sum = sum.add(after(path.align(), after(path.product(), exact)).min(most));
			}
			largest = largest.max(sum);
		}
		return largest;
	}

	private Node sum(Optional<NumberFormat> accumulator, BigInteger product, BigInteger total) throws InputException {
		if (accumulator.isEmpty() || holds(accumulator.get(), total)) {
			check(total, "the sum");
			return new Node("sum + product", total);
		}
		BigInteger held = largest(accumulator.get());
		check(held.add(product), "the sum in the accumulator and one more product");
		return limited(accumulator.get(), new Node("sum + product", held.add(product)));
	}

	private Node step(Requantizer step, Node before, String what) throws InputException {
		int shift = step.shift().orElseThrow(() -> new InputException("",
				"from one step size to the next there is a factor of "
				+ step.ratio() + "; the routine can only shift by powers of two"));
		Node after = before;
		if (shift > 0) {
			if (shift >= Long.SIZE) {
				throw new InputException("", what + " is rounded by " + shift + NO_ROOM);
			}
			rounds = true;
			after = new Node("shift_right(" + before.code + ", " + shift + ")", step.round(before.size)
					.add(BigInteger.ONE));
		} else if (shift < 0) {
			after = new Node("(" + before.code + ") * " + CTypes.literal(BigInteger.ONE.shiftLeft(-shift)),
					before.size.shiftLeft(-shift));
			check(BigInteger.ONE.shiftLeft(-shift), "the shift of " + what);
			check(after.size, what);
		}
		return step.range().isPresent() && !holds(step.range().get(), after.size) ? limited(step.range().get(), after)
				: after;
	}

	private Node limited(NumberFormat format, Node node) throws InputException {
		if (overflow == Overflow.SATURATE) {
			saturates = true;
			BigInteger highest = format.max().min(BigInteger.valueOf(Long.MAX_VALUE));
			return new Node("saturate(" + node.code + ", " + CTypes.literal(format.min()) + ", "
					+ CTypes.literal(highest) + ")",
					largest(format).min(node.size));
		}
		if (format.word() >= Long.SIZE) {
			throw new InputException("", "numbers wrap to " + format.word() + NO_ROOM + " and wraps to at most 63");
		}
		wrapsSigned |= format.signed();
		wrapsUnsigned |= !format.signed();
		return new Node((format.signed() ? "wrap_signed(" : "wrap_unsigned(") + node.code + ", " + format.word() + ")",
				largest(format));
	}

	private static BigInteger after(Requantizer step, BigInteger size) {
		BigInteger after = step.isExact() ? step.round(size) : step.round(size).add(BigInteger.ONE);
		return step.range().filter(format -> !holds(format, after)).map(CDatapath::largest).orElse(after);
	}

	private static boolean holds(NumberFormat format, BigInteger size) {
		return format.contains(size) && format.contains(size.negate());
	}

	private static BigInteger largest(NumberFormat format) {
		return format.max().max(format.min().negate());
	}

	private static void check(BigInteger size, String what) throws InputException {
		if (size.bitLength() >= Long.SIZE) {
			throw new InputException("", what + " may need " + (size.bitLength() + 1) + NO_ROOM);
		}
	}

	/** From coefficient and sample to what is added. */
	String product() {
		return product;
	}

	/** From sum and product to the sum. */
	String sum() {
		return sum;
	}

	/** From the finished sum to the output. */
	String output() {
		return output;
	}

	String outputType() {
		return outputType;
	}

	BigFraction outputStep() {
		return path.outputStep();
	}

	boolean rounds() {
		return rounds;
	}

	boolean saturates() {
		return saturates;
	}

	boolean wrapsSigned() {
		return wrapsSigned;
	}

	boolean wrapsUnsigned() {
		return wrapsUnsigned;
	}
}

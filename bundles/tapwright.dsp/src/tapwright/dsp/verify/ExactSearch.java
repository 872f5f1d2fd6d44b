// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

import org.apache.commons.math3.fraction.BigFraction;

import tapwright.dsp.exact.FixedPoint;
import tapwright.dsp.exact.Interval;

/**
 * Finds the place where |H|^2 over a squared upper limit is largest, or a squared lower limit over |H|^2, by branch
 * and bound in interval arithmetic of a chosen precision. This quotient is called the <i>load</i> of a place: a limit
 * is kept where the load is at most 1.
 */
final class ExactSearch {

	/**
	 * A stretch of frequency to search.
	 *
	 * @param lo
	 *            lower end in cycles per sample
	 * @param hi
	 *            upper end, included; not below {@code lo}
	 */
	record Stretch(LimitLine line, BigFraction lo, BigFraction hi) {
	}

	/**
	 * The largest load.
	 *
	 * @param lo
	 *            lower bound, attained at least at the place
	 * @param hi
	 *            upper bound, null for infinity
	 * @param line
	 *            limit at the place that gives the lower end
	 * @param place
	 *            this place in cycles per sample
	 */
	record Worst(BigInteger lo, BigInteger hi, LimitLine line, BigFraction place) {
	}

	// sharp: halving the stretch would not narrow the enclosure at this precision.
	private record Piece(Stretch stretch, BigInteger lo, BigInteger hi, BigFraction place, boolean sharp) {
	}

	private static final int HOPELESS_BITS = 100;

	private final FixedPoint fix;
	private final SplitTaps taps;
	private final double sampleRate;
	private final Interval logUnit;
	private final Patience patience;
	private final Map<LimitLine, InverseLimit> limits = new HashMap<>();

	ExactSearch(FixedPoint fix, SplitTaps taps, double sampleRate, Interval logUnit, Patience patience) {
		this.fix = fix;
		this.taps = taps;
		this.sampleRate = sampleRate;
		this.logUnit = logUnit;
		this.patience = patience;
	}

	/**
	 * Searches until the enclosure of the largest load is narrower than 2^-gapBits of it, precision or patience end.
	 *
	 * @param stretches
	 *            where to search
	 * @param known
	 *            a place whose load is known; when no load is larger, the search goes on until that is proven
	 */
	Worst worst(List<Stretch> stretches, int gapBits, Optional<Worst> known) {
		Piece best = known.map(worst -> new Piece(new Stretch(worst.line, worst.place, worst.place), worst.lo, worst.hi,
				worst.place, true)).orElse(null);
		BigInteger done = best == null ? BigInteger.ZERO : best.hi;
		boolean unbounded = false;
		List<Piece> pieces = new ArrayList<>();
		for (Stretch stretch : stretches) {
			pieces.add(measure(stretch));
		}
		while (true) {
			for (Piece piece : pieces) {
				best = best == null || piece.lo.compareTo(best.lo) > 0 ? piece : best;
			}
			boolean isKnown = known.isPresent() && best.lo.equals(known.get().lo);
			BigInteger enough = isKnown ? best.lo : best.lo.add(best.lo.shiftRight(gapBits));
			boolean hopeless = best.lo.bitLength() > fix.bits() + HOPELESS_BITS;
			List<Piece> open = new ArrayList<>();
			for (Piece piece : pieces) {
				if (piece.hi != null && piece.hi.compareTo(enough) <= 0) {
					done = done.max(piece.hi);
				} else if (hopeless || piece.sharp || patience.isOver() || tooSmall(piece.stretch)) {
					unbounded |= piece.hi == null;
					done = piece.hi == null ? done : done.max(piece.hi);
				} else {
					open.add(piece);
				}
			}
			if (open.isEmpty()) {
				return new Worst(best.lo, unbounded ? null : done.max(best.lo), best.stretch.line, best.place);
			}
			pieces = new ArrayList<>();
			for (Piece piece : open) {
				BigFraction middle = middle(piece.stretch.lo, piece.stretch.hi);
				pieces.add(measure(new Stretch(piece.stretch.line, piece.stretch.lo, middle)));
				pieces.add(measure(new Stretch(piece.stretch.line, middle, piece.stretch.hi)));
			}
		}
	}

	/** Encloses |H|^2 at one frequency, in the units of the coefficients. */
	static Interval square(FixedPoint fix, SplitTaps taps, BigFraction place) {
		LocalFunction local = taps.around(fix, place, BigFraction.ZERO);
		return local.polynomial().at(BigInteger.ZERO).widen(local.error());
	}

	// Halving a stretch this narrow changes nothing that the precision can see.
	private boolean tooSmall(Stretch stretch) {
		BigFraction width = stretch.hi.subtract(stretch.lo);
		return width.getNumerator().signum() == 0
				|| width.getDenominator().bitLength() - width.getNumerator().bitLength() > fix.bits();
	}

	private Piece measure(Stretch stretch) {
		patience.checkCancelled();
		BigFraction centre = middle(stretch.lo, stretch.hi);
		BigFraction radius = stretch.hi.subtract(centre);
		InverseLimit limit = limits.computeIfAbsent(stretch.line, line -> new InverseLimit(fix, line, logUnit,
				sampleRate));
		Optional<LocalFunction> inverse = limit.around(centre, radius);
		if (inverse.isEmpty()) {
			return new Piece(stretch, BigInteger.ZERO, null, centre, false);
		}
		LocalFunction quotient = taps.around(fix, centre, radius).multiply(inverse.get());
		IntervalPolynomial polynomial = stretch.line.upper() ? quotient.polynomial() : quotient.polynomial().negate();
		IntervalPolynomial.Largest largest = polynomial.largest();
		Interval value = largest.value().widen(quotient.error());
		Interval there = polynomial.at(largest.point());
		BigInteger noise = there.hi().subtract(there.lo()).shiftRight(1).add(quotient.error()).add(BigInteger.ONE);
		boolean sharp = value.hi().subtract(value.lo()).compareTo(noise.shiftLeft(3)) <= 0;
		BigFraction place = centre.add(radius.multiply(fix.rational(largest.point())));
		if (stretch.line.upper()) {
			return new Piece(stretch, value.lo().max(BigInteger.ZERO), value.hi().max(BigInteger.ZERO), place, sharp);
		}
		Interval least = value.negate();
		BigInteger high = least.lo().signum() <= 0 ? null : reciprocal(least.lo()).hi();
		return new Piece(stretch, reciprocal(least.hi().max(BigInteger.ONE)).lo(), high, place, sharp);
	}

	private Interval reciprocal(BigInteger value) {
		return fix.divide(fix.exact(fix.one()), fix.exact(value));
	}

	private static BigFraction middle(BigFraction lo, BigFraction hi) {
		return lo.add(hi).divide(2);
	}
}

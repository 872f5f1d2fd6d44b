// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.equiripple;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

import tapwright.dsp.Progress;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.Bands;
import tapwright.dsp.design.Design;
import tapwright.dsp.design.DesignException;
import tapwright.dsp.design.DesignResult;
import tapwright.dsp.design.LinearPhaseType;
import tapwright.dsp.exact.Symmetry;

/**
 * Linear-phase design with the least largest weighted error over all bands; between bands the response is free (T. W.
 * Parks and J. H. McClellan, Chebyshev approximation for nonrecursive digital filters with linear phase, IEEE
 * Transactions on Circuit Theory 19(2), 1972; all four types: J. H. McClellan and T. W. Parks, A unified approach to
 * the design of optimum FIR linear-phase digital filters, IEEE Transactions on Circuit Theory 20(6), 1973). Every
 * answer is checked by a proof before it is given.
 *
 * @param taps
 *            number of coefficients, at most {@link #LONGEST}
 * @param symmetry
 *            even, or odd for differentiators and Hilbert transformers
 * @param bands
 *            rising; two may touch where their desired amplitudes agree
 * @param tolerance
 *            how far the largest error may be above the best possible one, relatively; 1e-10 to 0.1
 */
public record Equiripple(int taps, Symmetry symmetry, List<Band> bands, double tolerance) implements Design {

	/** The greatest number of coefficients. */
	public static final int LONGEST = 8192;

	/** The usual tolerance. */
	public static final double STANDARD = 1e-4;

	private static final int MOST_BANDS = 256;
	/** A larger excess has other causes than rounding errors in the proof. */
	private static final double MISSED = 1e-5;
	/** Beyond this excess the answer is not worth having. */
	private static final double USELESS = 0.05;
	/** Gains between bands above this multiple of the largest desired one are mentioned. */
	private static final double HIGH_PEAK = 1.2;
	/** Gains between bands that explain why the proof failed. */
	private static final double UNBEARABLE = 1e3;

	/** Checks the parameters. */
	public Equiripple {
		if (taps < 1 || taps > LONGEST) {
			throw new IllegalArgumentException("an equiripple design of " + taps
					+ " coefficients was asked for; ask for 1 to " + LONGEST);
		}
		if (!(tolerance >= 1e-10 && tolerance <= 0.1)) {
			throw new IllegalArgumentException("the tolerance is " + tolerance + "; it must be between 1e-10 and 0.1");
		}
		bands = Bands.rising(bands, true);
		if (bands.size() > MOST_BANDS) {
			throw new IllegalArgumentException(bands.size() + " bands are too many; give at most " + MOST_BANDS);
		}
		for (int k = 1; k < bands.size(); k++) {
			Band before = bands.get(k - 1);
			Band band = bands.get(k);
			if (before.to() == band.from() && before.desiredTo() != band.desiredFrom()) {
				throw new IllegalArgumentException("the desired amplitude jumps from " + before.desiredTo() + " to "
						+ band.desiredFrom()
						+ " at " + band.from()
						+ " cycles per sample; no filter can follow: leave a transition between the bands");
			}
		}
		LinearPhaseType.of(taps, symmetry).refuseImpossible(bands);
	}

	/** With the usual tolerance. */
	public Equiripple(int taps, Symmetry symmetry, List<Band> bands) {
		this(taps, symmetry, bands, STANDARD);
	}

	@Override
	public DesignResult compute(Progress progress) throws DesignException {
		EquirippleSolution solution = solve(progress);
		return new DesignResult(solution.taps(), solution.notes());
	}

	/**
	 * Computes the coefficients and what is proven of them.
	 *
	 * @throws DesignException
	 *             when double precision cannot resolve the solution; says what to do
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	public EquirippleSolution solve(Progress progress) throws DesignException {
		return solve(progress, null).solution();
	}

	/** A solution and the reference that a search can go on from. */
	record Solved(EquirippleSolution solution, Reference reference) {
	}

	/**
	 * The same from the reference of another length, or from the usual start when there is none. Should the proof find
	 * a larger error than the exchange did, an extremum was missed; then it is done once more with a denser search.
	 */
	Solved solve(Progress progress, Reference warm) throws DesignException {
		Solved solved = attempt(progress, warm, false);
		if (solved.solution.excess() > Math.max(tolerance, MISSED)) {
			Solved thorough = attempt(progress, null, true);
			return thorough.solution.excess() < solved.solution.excess() ? thorough : solved;
		}
		return solved;
	}

	private Solved attempt(Progress progress, Reference warm, boolean thorough) throws DesignException {
		LinearPhaseType type = LinearPhaseType.of(taps, symmetry);
		int unknowns = type.unknowns(taps);
		Exchange exchange = new Exchange(type, bands, thorough, progress);
		Exchange.Outcome outcome = warm == null ? exchange.solve(unknowns, tolerance / 4)
				: exchange.solve(unknowns, tolerance / 4, warm);
		double[] h = type.taps(Recovery.coefficients(outcome.approximation(), unknowns));
		progress.checkCancelled();
		Reference reference = outcome.reference();
		return new Solved(proven(h, reference.frequencies(new Target(type, bands, unknowns)), reference.band()),
				reference);
	}

	private EquirippleSolution proven(double[] h, double[] extremes, int[] band) throws DesignException {
		WeightedError error = new WeightedError(symmetry, h, bands);
		double upper = error.largest(tolerance / 8).hi();
		double lower = error.leastAlternating(extremes, band);
		double wanted = 0;
		for (Band line : bands) {
			wanted = Math.max(wanted, Math.max(Math.abs(line.desiredFrom()), Math.abs(line.desiredTo())));
		}
		double peak = peakOutside(error);
		double excess = upper / lower - 1;
		if (!(excess <= USELESS)) {
			throw useless(lower, upper, peak, wanted);
		}
		List<String> notes = new ArrayList<>();
		if (peak > HIGH_PEAK * wanted) {
			notes.add(String.format(Locale.ROOT, "Between the bands the gain rises to about %.4g.", peak));
		}
		if (excess > tolerance) {
			notes.add(String.format(Locale.ROOT,
					"The largest weighted error is proven to be within %.2g of the best possible one,"
					+ " relatively; double precision gives no better proof.", excess));
		}
		return new EquirippleSolution(h, lower, upper, extremes, peak, List.copyOf(notes));
	}

	private static DesignException useless(double lower, double upper, double peak, double wanted) {
		if (peak > UNBEARABLE * wanted) {
			return new DesignException(String.format(Locale.ROOT, "the best filter has a gain of about %.1g between the"
					+ " bands, and coefficients in double precision cannot carry it; make the transitions more equal in"
					+ " width or reduce the taps", peak));
		}
		return new DesignException(Double.isFinite(upper)
				? String.format(Locale.ROOT,
				"the best weighted error is near what double precision resolves (errors up to %.3g, best"
						+ " possible %.3g); reduce the taps or narrow the transitions", upper, lower)
				: "rounding errors leave no usable coefficients; reduce the taps or widen very narrow bands");
	}

	private double peakOutside(WeightedError error) {
		double peak = 0;
		double end = 0;
		for (Band band : bands) {
			peak = end < band.from() ? Math.max(peak, error.peakBetween(end, band.from())) : peak;
			end = band.to();
		}
		return end < 0.5 ? Math.max(peak, error.peakBetween(end, 0.5)) : peak;
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

import static org.junit.jupiter.api.Assertions.fail;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Arrays;
import java.util.Random;

import tapwright.dsp.exact.Enclosure;
import tapwright.dsp.exact.ExactTaps;

/** Places limits very near the true worst gain on both sides and judges the proofs by the oracle. */
final class GainJudge {

	private static final double[] DISTANCES = { 1e-6, 1e-7, 1e-8, 1e-9, 1e-10, 1e-11, 1e-12 };
	private static final double WIDEST = 1e-6;
	/** The oracle's places are good to 1e-45, so a square below this part of the largest possible one is zero. */
	private static final BigDecimal NOTHING = new BigDecimal("1e-60");

	private final HardCases cases;
	private final Random random;
	int pairs;
	int unproven;
	int met;
	int missed;

	GainJudge(long seed) {
		cases = new HardCases(seed);
		random = new Random(~seed);
	}

	/** Judges proofs of one filter's limits. */
	void judge() {
		HardCases.Case subject = cases.next();
		ExactTaps taps = subject.taps();
		GainOracle oracle = new GainOracle(integers(taps));
		GainOracle.Extremes extremes = oracle.extremes(new BigDecimal(subject.from()), new BigDecimal(subject.to()));
		BigInteger sum = Arrays.stream(integers(taps)).map(BigInteger::abs).reduce(BigInteger.ZERO, BigInteger::add);
		BigDecimal nothing = new BigDecimal(sum.multiply(sum)).multiply(NOTHING);
		BigDecimal most = extremes.most().compareTo(nothing) < 0 ? null : decibels(extremes.most(), taps);
		BigDecimal least = extremes.least().compareTo(nothing) < 0 ? null : decibels(extremes.least(), taps);
		judge(subject, most, true, GainReference.ABSOLUTE);
		judge(subject, least, false, GainReference.ABSOLUTE);
		double other = random.nextDouble() / 2;
		double another = other + (0.5 - other) * random.nextDouble();
		boolean atFrequency = random.nextBoolean();
		GainReference reference = atFrequency ? new GainReference.AtFrequency(other)
				: new GainReference.LargestIn(other, another);
		BigDecimal square = oracle.extremes(new BigDecimal(other), new BigDecimal(atFrequency ? other : another))
				.most();
		if (square.compareTo(nothing) > 0) {
			BigDecimal zero = decibels(square, taps);
			judge(subject, most == null ? null : most.subtract(zero), true, reference);
			judge(subject, least == null ? null : least.subtract(zero), false, reference);
		}
	}

	private void judge(HardCases.Case subject, BigDecimal truth, boolean upper, GainReference reference) {
		if (truth == null) {
			return;
		}
		for (double distance : DISTANCES) {
			for (int side = -1; side <= 1; side += 2) {
				double limit = truth.doubleValue() + side * distance * (0.5 + random.nextDouble());
				GainLimit requirement = upper ? GainLimit.atMost(subject.from(), subject.to(), limit)
						: GainLimit.atLeast(subject.from(), subject.to(), limit);
				judge(subject, requirement.relativeTo(reference), truth, limit, upper);
			}
		}
	}

	private void judge(HardCases.Case subject, GainLimit requirement, BigDecimal truth, double limit, boolean upper) {
		Proof proof = requirement.prove(new Subject(subject.taps(), 1), Effort.STANDARD);
		BigDecimal margin = upper ? new BigDecimal(limit).subtract(truth) : truth.subtract(new BigDecimal(limit));
		boolean wrong = proof.verdict() == Verdict.MET && margin.signum() < 0
				|| proof.verdict() == Verdict.MISSED && margin.signum() >= 0;
		boolean outside = !contains(proof.value(), truth) || !contains(proof.margin(), margin);
		boolean wide = truth.doubleValue() > -1000 && proof.margin().width() > WIDEST;
		boolean astray = !(subject.from() <= proof.worst() && proof.worst() <= subject.to());
		pairs++;
		switch (proof.verdict()) {
			case MET -> met++;
			case MISSED -> missed++;
			case UNPROVEN -> unproven++;
		}
		if (wrong || outside || wide || astray) {
			fail((wrong ? "wrong verdict " : outside ? "truth outside the enclosure " : wide ? "wide enclosure "
					: "place outside the band ")
					+ subject + " " + requirement + " truth " + truth.doubleValue() + " margin "
							+ margin.doubleValue() + " "
					+ proof);
		}
	}

	private static boolean contains(Enclosure enclosure, BigDecimal value) {
		return compare(enclosure.lo(), value) <= 0 && compare(enclosure.hi(), value) >= 0;
	}

	private static int compare(double a, BigDecimal b) {
		return Double.isInfinite(a) ? a > 0 ? 1 : -1 : new BigDecimal(a).compareTo(b);
	}

	static BigInteger[] integers(ExactTaps taps) {
		BigInteger[] integers = new BigInteger[taps.length()];
		for (int k = 0; k < integers.length; k++) {
			integers[k] = taps.integer(k);
		}
		return integers;
	}

	/** Decibels of a squared gain in units of coefficients; null for zero. */
	static BigDecimal decibels(BigDecimal square, ExactTaps taps) {
		if (square.signum() == 0) {
			return null;
		}
		BigDecimal unit = new BigDecimal(taps.unit().getNumerator()).divide(new BigDecimal(taps.unit()
				.getDenominator()),
				OracleMath.DIGITS);
		return OracleMath.log10(square.multiply(unit, OracleMath.DIGITS).multiply(unit, OracleMath.DIGITS))
				.multiply(BigDecimal.TEN);
	}
}

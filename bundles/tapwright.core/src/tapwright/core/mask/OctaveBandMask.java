// SPDX-License-Identifier: EPL-2.0
package tapwright.core.mask;

import java.util.List;
import java.util.Map;

import tapwright.core.InputException;
import tapwright.model.Interpolation;
import tapwright.model.Requirement;
import tapwright.model.Side;

/**
 * Limits of relative attenuation of octave-band and fractional-octave-band filters, class 1, by IEC 61260:1995, table 1; between
 * the printed frequencies the limits are straight in dB over the logarithm of frequency. The numbers are recalled, the document was
 * not at hand; the edition of 2014 (IEC 61260-1) has wider limits.
 *
 * @param fraction
 *            1 for octave bands, 3 for third-octave bands
 */
record OctaveBandMask(int fraction) implements PublishedMask {

	private static final MaskChoice MIDBAND = new MaskChoice("exact mid-band frequency", "Hz", 1000);

	/** Ratio of an octave, base ten. */
	private static final double OCTAVE = Math.pow(10, 0.3);

	/** Octaves from the middle, least and most relative attenuation in dB; the step at half an octave stands twice. */
	private static final double[][] CORNERS = { { 0, -0.3, 0.3 }, { 1.0 / 8, -0.3, 0.4 }, { 1.0 / 4, -0.3, 0.6 },
			{ 3.0 / 8, -0.3, 1.3 }, { 1.0 / 2, -0.3, 5.0 }, { 1.0 / 2, 2.0, Double.NaN }, { 1, 17.5, Double.NaN },
			{ 2, 42, Double.NaN }, { 3, 61, Double.NaN }, { 4, 70, Double.NaN } };

	@Override
	public String id() {
		return fraction == 1 ? "octave-band-class-1" : "third-octave-band-class-1";
	}

	@Override
	public String title() {
		return (fraction == 1 ? "Octave band" : "Third-octave band") + ", class 1";
	}

	@Override
	public String source() {
		return "IEC 61260:1995, table 1 (recalled, without the document at hand)";
	}

	@Override
	public List<MaskChoice> choices() {
		return List.of(MIDBAND);
	}

	@Override
	public List<Requirement> requirements(double sampleRate, Map<String, Double> values) throws InputException {
		double middle = MIDBAND.positive(values);
		var upper = new LimitCurve(Side.MAX, Interpolation.LOG);
		var lower = new LimitCurve(Side.MIN, Interpolation.LOG);
		double last = -CORNERS[CORNERS.length - 1][1];
		for (int k = CORNERS.length - 1; k > 0; k--) {
			add(upper, lower, middle / ratio(CORNERS[k][0]), CORNERS[k]);
		}
		for (double[] corner : CORNERS) {
			add(upper, lower, middle * ratio(corner[0]), corner);
		}
		upper.add(Double.MAX_VALUE, last);
		String note = source();
		return List.of(lower.requirement("in-band", note, sampleRate), upper.requirement("skirts", note, sampleRate),
				below(middle / ratio(4), last, note));
	}

	// From 0 Hz to the first printed frequency the last limit goes on.
	private static Requirement below(double to, double level, String note) throws InputException {
		var rest = new LimitCurve(Side.MAX, Interpolation.LINEAR);
		rest.add(0, level);
		rest.add(to, level);
		return rest.requirement("far-below", note, Double.MAX_VALUE);
	}

	private static void add(LimitCurve upper, LimitCurve lower, double frequency, double[] corner) {
		upper.add(frequency, -corner[1]);
		if (!Double.isNaN(corner[2])) {
			lower.add(frequency, -corner[2]);
		}
	}

	// The standard stretches the octave's frequencies for fractions of an octave linearly (IEC 61260:1995, equation for Omega).
	private double ratio(double octaves) {
		double octave = Math.pow(OCTAVE, octaves);
		double half = Math.pow(OCTAVE, 0.5);
		return 1 + (Math.pow(OCTAVE, 0.5 / fraction) - 1) / (half - 1) * (octave - 1);
	}
}

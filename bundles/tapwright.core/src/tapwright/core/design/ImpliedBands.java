// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Words;
import tapwright.dsp.design.Band;
import tapwright.model.GainRequirement;
import tapwright.model.Requirement;

/**
 * The target that gain requirements imply: in the middle between the limits where there are two, zero where there is only an upper
 * one far below 0 dB, and no wish where there is only an upper one near 0 dB. The weight is the inverse of the tolerance.
 */
public final class ImpliedBands {

	/** An upper limit alone asks for a stop band below this amplitude, and above it only forbids excess. */
	private static final double STOP_BAND = 0.5;
	private static final double SAME = 1e-12;
	/** Limits in dB become amplitudes with rounding errors; this much wider, the target excludes nothing that meets them. */
	private static final double WIDER = 1 + 1e-9;

	private ImpliedBands() {
	}

	static List<Band> of(List<Requirement> requirements, double sampleRate, Numbers numbers) throws InputException {
		var corridors = new ArrayList<Corridor>();
		for (Requirement requirement : requirements) {
			if (requirement instanceof GainRequirement gain) {
				corridors.addAll(Corridor.of(gain, numbers));
			}
		}
		double half = sampleRate / 2;
		var edges = new TreeSet<Double>();
		for (Corridor corridor : corridors) {
			edges.add(Math.min(corridor.from(), half));
			edges.add(Math.min(corridor.to(), half));
		}
		var bands = new ArrayList<Band>();
		Double from = null;
		for (Double to : edges) {
			if (from != null) {
				add(bands, corridors, from, to, sampleRate);
			}
			from = to;
		}
		if (bands.isEmpty()) {
			throw new InputException("bands", "there are none, and no gain requirement implies any; add one or the other");
		}
		return bands;
	}

	/**
	 * Whether the deviation 1 / weight from the desired amplitude is all that the requirements allow, so that a target that cannot be
	 * met shows that the requirements cannot. With several bands that pass, their amplitudes could differ in sign; a sloping limit is
	 * only approximated; a relative limit moves with the filter.
	 */
	static boolean areLimits(List<Requirement> requirements, List<Band> bands) {
		return bands.stream().filter(band -> band.desiredFrom() != 0 || band.desiredTo() != 0).count() <= 1
				&& requirements.stream().filter(GainRequirement.class::isInstance).map(GainRequirement.class::cast)
						.allMatch(gain -> gain.getPoints().isEmpty() && gain.getReferenceAt() == null
								&& gain.getReferenceFrom() == null && gain.getReferenceTo() == null);
	}

	/** The attenuation in dB that the smallest tolerance of all bands asks for; a window gives the same ripple at every edge. */
	public static double attenuation(List<Band> bands) {
		double weight = bands.stream().mapToDouble(band -> Math.max(band.weightFrom(), band.weightTo())).max().orElseThrow();
		return 20 * Math.log10(weight);
	}

	private static void add(List<Band> bands, List<Corridor> corridors, double from, double to, double sampleRate)
			throws InputException {
		double[] lower = { Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY };
		double[] upper = { Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY };
		for (Corridor corridor : corridors) {
			if (corridor.from() <= from && to <= corridor.to()) {
				for (int end = 0; end < 2; end++) {
					double at = end == 0 ? from : to;
					lower[end] = Math.max(lower[end], corridor.lower(at));
					upper[end] = Math.min(upper[end], corridor.upper(at));
				}
			}
		}
		if (lower[0] >= upper[0] || lower[1] >= upper[1]) {
			throw new InputException("requirements", "the gain limits contradict each other " + Words.band(from, to));
		}
		double[] desired = new double[2];
		double[] tolerance = new double[2];
		for (int end = 0; end < 2; end++) {
			if (Double.isInfinite(lower[end])) {
				if (upper[end] >= STOP_BAND) {
					return;
				}
				tolerance[end] = upper[end];
			} else {
				desired[end] = Double.isInfinite(upper[end]) ? Math.max(1, 1.01 * lower[end]) : (lower[end] + upper[end]) / 2;
				tolerance[end] = desired[end] - lower[end];
			}
			tolerance[end] *= WIDER;
		}
		var band = new Band(from / sampleRate, Math.min(to / sampleRate, 0.5), desired[0], desired[1], 1 / tolerance[0],
				1 / tolerance[1]);
		if (!bands.isEmpty() && continues(bands.getLast(), band)) {
			Band last = bands.removeLast();
			band = new Band(last.from(), band.to(), last.desiredFrom(), band.desiredTo(), last.weightFrom(), band.weightTo());
		}
		bands.add(band);
	}

	// Two flat pieces with the same target are one band.
	private static boolean continues(Band last, Band next) {
		return last.to() == next.from() && flat(last) && flat(next) && Math.abs(last.desiredTo() - next.desiredFrom()) < SAME
				&& Math.abs(last.weightTo() - next.weightFrom()) < SAME * last.weightTo();
	}

	private static boolean flat(Band band) {
		return band.desiredFrom() == band.desiredTo() && band.weightFrom() == band.weightTo();
	}
}

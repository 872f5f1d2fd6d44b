// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design.leastsquares;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * A limit on one side for every frequency of a stretch: sign times the amplitude, or its scaled slope, is at most
 * bound(f) + room(f) t, where t is a further unknown that may be absent.
 *
 * @param from
 *            lower edge in cycles per sample
 * @param to
 *            upper edge in cycles per sample
 * @param derivative
 *            0 for the amplitude, 1 for its slope as {@link LinearPhaseBasis#row} scales it
 * @param sign
 *            1 or -1
 * @param bound
 *            the fixed part of the limit
 * @param room
 *            how much t widens it
 */
public record Side(double from, double to, int derivative, int sign, DoubleUnaryOperator bound, DoubleUnaryOperator room) {

	/** The one or two sides of a limit, tightened by a margin. */
	public static List<Side> of(AmplitudeLimit limit, double margin) {
		List<Side> sides = new ArrayList<>();
		double width = limit.to() - limit.from();
		if (!Double.isInfinite(limit.upperFrom())) {
			sides.add(new Side(limit.from(), limit.to(), 0, 1, f -> limit.upperFrom()
					+ (limit.upperTo() - limit.upperFrom()) * ((f - limit.from()) / width) - margin, f -> 0));
		}
		if (!Double.isInfinite(limit.lowerFrom())) {
			sides.add(new Side(limit.from(), limit.to(), 0, -1, f -> -limit.lowerFrom()
					- (limit.lowerTo() - limit.lowerFrom()) * ((f - limit.from()) / width) - margin, f -> 0));
		}
		return sides;
	}
}

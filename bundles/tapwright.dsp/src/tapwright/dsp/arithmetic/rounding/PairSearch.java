// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.arithmetic.rounding;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;

import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;

/** Local search by the judge alone: coefficients one step up or down, each with its mirror, alone and two at a time. */
final class PairSearch {

	private final Best best;
	private final Symmetry symmetry;
	private final int length;
	private final List<Integer> places = new ArrayList<>();

	PairSearch(RoundingTask task, Best best) {
		this.best = best;
		symmetry = task.ideal().symmetry();
		length = task.ideal().length();
		int count = switch (symmetry) {
		case EVEN -> (length + 1) / 2;
		case ODD -> length / 2;
		case NONE -> length;
		};
		for (int k = 0; k < count; k++) {
			places.add(k);
		}
		Collections.shuffle(places, new Random(best.seed()));
	}

	void run() {
		boolean improved = true;
		while (improved && !best.isOver()) {
			improved = singles() || pairs();
		}
	}

	private boolean singles() {
		ExactTaps from = best.rounded().taps();
		boolean improved = false;
		for (int place : places) {
			for (int step = -1; step <= 1 && !best.isOver(); step += 2) {
				if (best.offer(moved(from, place, step))) {
					improved = true;
					from = best.rounded().taps();
				}
			}
		}
		return improved;
	}

	private boolean pairs() {
		ExactTaps from = best.rounded().taps();
		for (int a = 0; a < places.size(); a++) {
			for (int b = 0; b < a; b++) {
				for (int signs = 0; signs < 4 && !best.isOver(); signs++) {
					ExactTaps once = moved(from, places.get(a), (signs & 1) == 0 ? 1 : -1);
					if (best.offer(moved(once, places.get(b), (signs & 2) == 0 ? 1 : -1))) {
						return true;
					}
				}
			}
		}
		return false;
	}

	private ExactTaps moved(ExactTaps from, int place, int step) {
		List<BigInteger> integers = new ArrayList<>(length);
		for (int k = 0; k < length; k++) {
			integers.add(from.integer(k));
		}
		BigInteger next = integers.get(place).add(BigInteger.valueOf(step));
		integers.set(place, next);
		if (symmetry != Symmetry.NONE) {
			integers.set(length - 1 - place, symmetry == Symmetry.ODD ? next.negate() : next);
		}
		return ExactTaps.ofIntegers(integers, from.unit());
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Random;

import tapwright.dsp.Progress;
import tapwright.dsp.design.equiripple.Equiripple;
import tapwright.dsp.design.equiripple.EquirippleFamily;
import tapwright.dsp.design.window.KaiserWindow;
import tapwright.dsp.design.window.WindowDesign;
import tapwright.dsp.exact.Symmetry;
import tapwright.dsp.verify.Verdict;

/**
 * Times the designs beside scipy in one run, when python3 with scipy is installed: best of many runs, warm, one thread.
 * Every time of ours includes the proof. Not a test; start main.
 */
public final class DesignBenchmark {

	private static final double SECONDS_EACH = 0.6;

	private DesignBenchmark() {
	}

	private interface Work {
		/** Returns the weighted error, or nothing. */
		String run() throws DesignException;
	}

	/** Prints one line per design. */
	public static void main(String[] args) throws IOException, DesignException {
		Map<String, String[]> reference = reference();
		System.out.println("design                  ours ms  scipy ms  ratio  ours error             scipy error");
		warmUp();
		for (int taps : new int[] { 51, 201, 801, 2001, 4001 }) {
			equiripple(reference, taps, 0.2 + 57 / (14.6 * (taps - 1)), 10);
		}
		equiripple(reference, 401, 0.22, 1);
		equiripple(reference, 1001, 0.205, 1);
		equiripple(reference, 2001, 0.205, 1);
		equiripple(reference, 4001, 0.2025, 1);
		for (int taps : new int[] { 51, 801 }) {
			var design = WindowDesign.lowPass(taps, 0.2, new KaiserWindow(7));
			line(reference, "window " + taps, () -> {
				design.compute(Progress.NONE);
				return "";
			});
		}
		search();
	}

	// Until the compiler has had its time.
	private static void warmUp() throws DesignException {
		var design = new Equiripple(61, Symmetry.EVEN, List.of(new Band(0, 0.2, 1, 1), new Band(0.25, 0.5, 0, 1)));
		for (long end = System.nanoTime() + 3_000_000_000L; System.nanoTime() < end;) {
			design.solve(Progress.NONE);
		}
	}

	private static void equiripple(Map<String, String[]> reference, int taps, double stop,
			double weight) throws DesignException {
		var design = new Equiripple(taps, Symmetry.EVEN, List.of(new Band(0, 0.2, 1, 1),
				new Band(stop, 0.5, 0, weight)));
		line(reference, "equiripple " + taps + " " + (weight == 1 ? stop : ""), 
				() -> Double.toString(design.solve(Progress.NONE).upperBound()));
	}

	private static void line(Map<String, String[]> reference, String name, Work work) throws DesignException {
		String error;
		long least = Long.MAX_VALUE;
		long end = System.nanoTime() + (long) (SECONDS_EACH * 1e9);
		do {
			long start = System.nanoTime();
			error = work.run();
			least = Math.min(least, System.nanoTime() - start);
		} while (System.nanoTime() < end);
		String[] other = reference.getOrDefault(name.trim(), new String[] { "", "NaN", "not run" });
		double seconds = Double.parseDouble(other[1].equals("nan") ? "NaN" : other[1]);
		System.out.printf(Locale.ROOT, "%-22s %8.3f  %8.3f  %5.2f  %-21s  %s%n", name, least / 1e6, seconds * 1e3,
				least / 1e9 / seconds,
				error, other[2]);
	}

	// Shortest equiripple low-passes for random tolerances, accepted by the proven bound.
	private static void search() {
		long best = Long.MAX_VALUE;
		int count = 100;
		for (int round = 0; round < 4; round++) {
			var random = new Random(9);
			long start = System.nanoTime();
			for (int k = 0; k < count; k++) {
				double edge = 0.05 + 0.3 * random.nextDouble();
				double width = 0.015 + 0.1 * random.nextDouble();
				List<Band> bands = List.of(new Band(0, edge, 1, Math.pow(10, 1 + 2 * random.nextDouble())),
						new Band(edge + width, 0.5, 0, Math.pow(10, 1 + 3 * random.nextDouble())));
				new ShortestSearch(taps -> meets(taps, bands) ? Verdict.MET : Verdict.MISSED, 2000, Progress.NONE)
						.search(new EquirippleFamily(Symmetry.EVEN, bands, true)).found().orElseThrow();
			}
			best = Math.min(best, System.nanoTime() - start);
		}
		System.out.printf(Locale.ROOT,
				"shortest filter, both parities, a coarse grid instead of the proof: %.2f ms each%n",
				best / 1e6 / count);
	}

	private static boolean meets(double[] taps, List<Band> bands) {
		int points = 4 * taps.length;
		for (Band band : bands) {
			for (int i = 0; i <= points; i++) {
				double f = Math.min(band.from() + (band.to() - band.from()) * i / points, band.to());
				double x = 2 * Math.cos(2 * Math.PI * f);
				// G. Goertzel's recurrence, 1958: accurate enough here.
				double now = 0;
				double before = 0;
				for (double tap : taps) {
					double next = tap + x * now - before;
					before = now;
					now = next;
				}
				double re = now - before * x / 2;
				double magnitude = Math.hypot(re, before * Math.sin(2 * Math.PI * f));
				if (band.weight(f) * Math.abs(magnitude - band.desired(f)) > 1) {
					return false;
				}
			}
		}
		return true;
	}

	private static Map<String, String[]> reference() throws IOException {
		Map<String, String[]> lines = new LinkedHashMap<>();
		try (var script = DesignBenchmark.class.getResourceAsStream("time_designs.py")) {
			Process python = new ProcessBuilder("python3", "-").redirectError(ProcessBuilder.Redirect.DISCARD).start();
			try (var in = python.getOutputStream()) {
				script.transferTo(in);
			}
			String text = new String(python.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
			text.lines().map(line -> line.split(";", -1)).forEach(cells -> lines.put(cells[0], cells));
		} catch (IOException e) {
			System.out.println("python3 did not start, so there is nothing to compare with: " + e.getMessage());
		}
		return lines;
	}
}

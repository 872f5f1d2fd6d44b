// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;

import tapwright.core.InputException;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Numbers;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.Progress;
import tapwright.dsp.arithmetic.Arithmetic;
import tapwright.dsp.arithmetic.Cost;
import tapwright.dsp.arithmetic.Structure;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.FilterFamily;
import tapwright.dsp.design.LengthEstimate;
import tapwright.dsp.design.ShortestFilter;
import tapwright.dsp.design.ShortestSearch;
import tapwright.dsp.design.equiripple.EquirippleFamily;
import tapwright.dsp.design.window.KaiserEstimate;
import tapwright.dsp.design.window.KaiserWindow;
import tapwright.dsp.design.window.WindowDesign;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Symmetry;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Verdict;
import tapwright.model.BandDesign;
import tapwright.model.Filter;
import tapwright.model.ModelPackage;

/**
 * The shortest filters that several methods find, proven to meet every requirement in the numbers that ship. Taken from the model on
 * the thread that owns it; each method can be searched on any thread.
 */
public final class Candidates {

	/** Longest filter that is tried. */
	public static final int LONGEST = 4001;

	private final FilterQuestion question;
	private final List<Band> bands;
	private final boolean limitsAreWeights;

	private Candidates(FilterQuestion question, List<Band> bands, boolean limitsAreWeights) {
		this.question = question;
		this.bands = bands;
		this.limitsAreWeights = limitsAreWeights;
	}

	/**
	 * The search for a filter.
	 *
	 * @throws InputException
	 *             when the requirements imply no target, or a number makes no sense
	 */
	public static Candidates of(Filter filter, Expression.Names parameters) throws InputException {
		FilterQuestion question = FilterQuestion.of(filter, parameters);
		FilterEvidence evidence = question.answerFor(ExactTaps.ofDoubles(1), new Effort(Progress.NONE, Duration.ZERO));
		if (evidence.requirements().isEmpty()) {
			throw new InputException("requirements", "there are none that a search could meet; add one");
		}
		var numbers = new Numbers(parameters);
		var input = new DesignInput(filter, numbers.get(filter, ModelPackage.Literals.FILTER__SAMPLE_RATE), numbers);
		boolean stated = filter.getDesign() instanceof BandDesign design && !design.getBands().isEmpty();
		List<Band> bands = stated ? input.bands((BandDesign) filter.getDesign())
				: ImpliedBands.of(filter.getRequirements(), input.sampleRate(), numbers);
		return new Candidates(question, bands, !stated && ImpliedBands.areLimits(filter.getRequirements(), bands));
	}

	/** Names of the methods that {@link #search} knows, as in interchange files. */
	public static List<String> methods() {
		return List.of("equiripple", "window");
	}

	/**
	 * Searches with one method.
	 *
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	public Candidate search(String method, Progress progress) {
		var effort = new Effort(progress, Effort.STANDARD.timeLimit());
		var search = new ShortestSearch(taps -> judge(taps, effort), LONGEST, progress);
		ShortestFilter shortest = search.search(family(method));
		var notes = new ArrayList<>(shortest.notes());
		shortest.found().ifPresent(found -> notes.addAll(found.result().notes()));
		return new Candidate(method, shortest.found().map(found -> solution(found, effort)), notes);
	}

	private Verdict judge(double[] taps, Effort effort) {
		FilterEvidence evidence = question.answerFor(ExactTaps.ofDoubles(taps), effort);
		return evidence.verdict();
	}

	private Candidate.Solution solution(ShortestFilter.Found found, Effort effort) {
		double[] taps = found.result().taps();
		ExactTaps stored = ExactTaps.ofDoubles(taps);
		Arithmetic arithmetic = question.arithmetic().orElse(Arithmetic.exact(Structure.DIRECT, 1));
		ExactTaps shipped = arithmetic.coefficient().map(format -> format.nearest(stored)).orElse(stored);
		return new Candidate.Solution(taps, found.design(), found.provenShortest(), question.answerFor(stored, effort),
				Cost.of(shipped, arithmetic).multiplies());
	}

	private FilterFamily family(String method) {
		return switch (method) {
		case "equiripple" -> new EquirippleFamily(Symmetry.EVEN, bands, limitsAreWeights);
		case "window" -> {
			var window = new KaiserWindow(KaiserEstimate.beta(ImpliedBands.attenuation(bands)));
			yield FilterFamily.of(method, LengthEstimate.forBands(bands),
					taps -> new WindowDesign(taps, Symmetry.EVEN, bands, window));
		}
		default -> throw new IllegalArgumentException("there is no search with the method '" + method + "'");
		};
	}
}

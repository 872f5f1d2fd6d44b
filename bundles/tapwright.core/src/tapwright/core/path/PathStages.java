// SPDX-License-Identifier: EPL-2.0
package tapwright.core.path;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Words;
import tapwright.dsp.verify.Subject;
import tapwright.model.Decimation;
import tapwright.model.Expansion;
import tapwright.model.FilterStage;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.SignalPath;
import tapwright.model.Stage;

/** Reads the stages of a path: exact steps, rates, and all that is wrong with them. */
final class PathStages {

	/** Rates are quotients that were rounded once or twice. */
	private static final double SAME_RATE = 1e-12;

	private final Numbers numbers;
	private final Function<String, Optional<Subject>> filters;
	private final List<Step> steps = new ArrayList<>();
	private final List<Double> rates = new ArrayList<>();
	private final Set<String> names = new HashSet<>();
	private final List<String> problems = new ArrayList<>();

	PathStages(SignalPath path, Numbers numbers, Function<String, Optional<Subject>> filters) {
		this.numbers = numbers;
		this.filters = filters;
		try {
			double rate = numbers.get(path, Literals.SIGNAL_PATH__SAMPLE_RATE);
			if (!(rate > 0)) {
				throw new InputException("sampleRate", rate + " Hz must be positive");
			}
			rates.add(rate);
		} catch (InputException e) {
			problems.add(e.describe());
		}
		for (int k = 0; k < path.getStages().size(); k++) {
			try {
				read(path.getStages().get(k));
			} catch (InputException e) {
				problems.add("stage " + (k + 1) + ": " + e.describe());
			}
		}
		if (path.getStages().isEmpty()) {
			problems.add("it has no stages; add its filters and rate changes");
		}
	}

	List<Step> steps() {
		return steps;
	}

	List<Double> rates() {
		return problems.isEmpty() ? rates : List.of();
	}

	Set<String> names() {
		return names;
	}

	List<String> problems() {
		return problems;
	}

	private void read(Stage stage) throws InputException {
		switch (stage) {
		case FilterStage filter -> readFilter(Objects.requireNonNullElse(filter.getFilter(), ""));
		case Decimation decimation -> {
			int factor = factor(numbers.getInt(decimation, Literals.DECIMATION__FACTOR));
			steps.add(new Step.Lowering(factor));
			follow(1, factor);
		}
		case Expansion expansion -> {
			int factor = factor(numbers.getInt(expansion, Literals.EXPANSION__FACTOR));
			steps.add(new Step.Raising(factor));
			follow(factor, 1);
		}
		default -> throw new IllegalStateException("unknown stage " + stage.eClass().getName());
		}
	}

	private void readFilter(String name) throws InputException {
		names.add(name);
		Subject subject = filters.apply(name).orElseThrow(
				() -> new InputException("", name.isEmpty() ? "it names no filter; choose one"
						: "the portfolio has no filter '" + name + "' with usable coefficients"));
		steps.add(new Step.Filtering(name, subject.taps()));
		if (rates.isEmpty()) {
			return;
		}
		double rate = rates.getLast();
		follow(1, 1);
		if (Math.abs(subject.sampleRate() - rate) > SAME_RATE * rate) {
			throw new InputException("", "'" + name + "' is meant for " + Words.exactly(subject.sampleRate(), "Hz") + ", but runs at "
					+ Words.exactly(rate, "Hz") + " here");
		}
	}

	private void follow(int up, int down) {
		if (!rates.isEmpty()) {
			rates.add(rates.getLast() * up / down);
		}
	}

	private static int factor(int factor) throws InputException {
		if (factor < 1) {
			throw new InputException("factor", factor + " must be at least 1");
		}
		return factor;
	}
}

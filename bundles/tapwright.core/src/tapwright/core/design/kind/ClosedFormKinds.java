// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design.kind;

import java.util.List;

import tapwright.core.design.DesignKind;
import tapwright.dsp.design.special.Binomial;
import tapwright.dsp.design.special.LagrangeDelay;
import tapwright.dsp.design.special.MaximallyFlat;
import tapwright.dsp.design.special.MovingAverage;
import tapwright.dsp.design.special.RaisedCosine;
import tapwright.dsp.design.special.SavitzkyGolay;
import tapwright.model.BinomialDesign;
import tapwright.model.LagrangeDelayDesign;
import tapwright.model.MaximallyFlatDesign;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.MovingAverageDesign;
import tapwright.model.RaisedCosineDesign;
import tapwright.model.SavitzkyGolayDesign;

/** Methods in closed form. */
public final class ClosedFormKinds {

	/** All of them. */
	public static final List<DesignKind<?>> ALL = List.of(
			new PlainDesignKind<>(MovingAverageDesign.class, (design, input) -> new MovingAverage(
					input.numbers().getInt(design, Literals.MOVING_AVERAGE_DESIGN__TAPS),
					input.numbers().findInt(design, Literals.MOVING_AVERAGE_DESIGN__SECTIONS).orElse(1))),
			new PlainDesignKind<>(BinomialDesign.class,
					(design, input) -> new Binomial(input.numbers().getInt(design, Literals.BINOMIAL_DESIGN__ORDER))),
			new PlainDesignKind<>(MaximallyFlatDesign.class, (design, input) -> new MaximallyFlat(
					input.numbers().getInt(design, Literals.MAXIMALLY_FLAT_DESIGN__FLATNESS),
					input.numbers().getInt(design, Literals.MAXIMALLY_FLAT_DESIGN__ZEROS))),
			new PlainDesignKind<>(SavitzkyGolayDesign.class, (design, input) -> new SavitzkyGolay(
					input.numbers().getInt(design, Literals.SAVITZKY_GOLAY_DESIGN__POINTS),
					input.numbers().getInt(design, Literals.SAVITZKY_GOLAY_DESIGN__DEGREE),
					input.numbers().findInt(design, Literals.SAVITZKY_GOLAY_DESIGN__DERIVATIVE).orElse(0),
					input.numbers().findInt(design, Literals.SAVITZKY_GOLAY_DESIGN__POSITION).orElse(0))),
			new PlainDesignKind<>(LagrangeDelayDesign.class, (design, input) -> new LagrangeDelay(
					input.numbers().getInt(design, Literals.LAGRANGE_DELAY_DESIGN__ORDER),
					input.numbers().get(design, Literals.LAGRANGE_DELAY_DESIGN__DELAY) * input.sampleRate())),
			new PlainDesignKind<>(RaisedCosineDesign.class, (design, input) -> new RaisedCosine(
					input.numbers().get(design, Literals.RAISED_COSINE_DESIGN__ROLL_OFF),
					input.numbers().getInt(design, Literals.RAISED_COSINE_DESIGN__SAMPLES_PER_SYMBOL),
					input.numbers().getInt(design, Literals.RAISED_COSINE_DESIGN__SYMBOLS), design.isRoot(),
					RaisedCosine.Gain.valueOf(design.getGain().name()))));

	private ClosedFormKinds() {
	}
}

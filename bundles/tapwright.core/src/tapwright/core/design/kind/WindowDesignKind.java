// SPDX-License-Identifier: EPL-2.0
package tapwright.core.design.kind;

import java.util.List;
import java.util.OptionalDouble;

import tapwright.core.InputException;
import tapwright.core.design.DesignInput;
import tapwright.core.design.DesignKind;
import tapwright.core.design.ImpliedBands;
import tapwright.dsp.design.Band;
import tapwright.dsp.design.window.CommonWindow;
import tapwright.dsp.design.window.DolphChebyshevWindow;
import tapwright.dsp.design.window.GaussianWindow;
import tapwright.dsp.design.window.KaiserEstimate;
import tapwright.dsp.design.window.KaiserWindow;
import tapwright.dsp.design.window.SlepianWindow;
import tapwright.dsp.design.window.TukeyWindow;
import tapwright.dsp.design.window.Window;
import tapwright.dsp.exact.Symmetry;
import tapwright.model.ModelPackage.Literals;
import tapwright.model.WindowDesign;

/** The ideal response cut by a window. */
public final class WindowDesignKind implements DesignKind<WindowDesign> {

	@Override
	public Class<WindowDesign> type() {
		return WindowDesign.class;
	}

	@Override
	public tapwright.dsp.design.Design method(WindowDesign design, DesignInput input) throws InputException {
		List<Band> bands = input.bands(design);
		return new tapwright.dsp.design.window.WindowDesign(input.numbers().getInt(design, Literals.BAND_DESIGN__TAPS),
				Symmetry.EVEN, bands, window(design, bands, input));
	}

	private static Window window(WindowDesign design, List<Band> bands, DesignInput input) throws InputException {
		OptionalDouble parameter = input.numbers().find(design, Literals.WINDOW_DESIGN__PARAMETER);
		if (design.getWindow() == tapwright.model.WindowKind.KAISER && parameter.isEmpty()) {
			return new KaiserWindow(KaiserEstimate.beta(ImpliedBands.attenuation(bands)));
		}
		return switch (design.getWindow()) {
		case KAISER -> new KaiserWindow(needed(parameter));
		case DOLPH_CHEBYSHEV -> new DolphChebyshevWindow(needed(parameter));
		case GAUSSIAN -> new GaussianWindow(needed(parameter));
		case TUKEY -> new TukeyWindow(needed(parameter));
		case DISCRETE_PROLATE -> new SlepianWindow(needed(parameter));
		default -> {
			if (parameter.isPresent()) {
				throw new InputException("parameter", "the " + design.getWindow().getLiteral() + " window has none; remove it");
			}
			yield CommonWindow.valueOf(design.getWindow().name());
		}
		};
	}

	private static double needed(OptionalDouble parameter) throws InputException {
		return parameter.orElseThrow(() -> new InputException("parameter", "is missing; this window has a shape parameter"));
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.picture;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

import org.apache.commons.math3.complex.Complex;

import tapwright.charts.Axis;
import tapwright.charts.Curve;
import tapwright.charts.Plot;
import tapwright.charts.Window;
import tapwright.dsp.response.Zeros;

/** Zeros in the z plane, with the unit circle. Pure functions, for the background. */
final class ZeroPictures {

	private static final int POINTS_OF_CIRCLE = 361;
	private static final double USUAL_RADIUS = 1.6;

	private ZeroPictures() {
	}

	static Plot of(List<Overlay> drawn, String title) {
		var curves = new ArrayList<Curve>();
		for (Overlay overlay : drawn) {
			List<Complex> zeros = Zeros.of(overlay.snapshot().subject().orElseThrow().taps().toDoubles());
			curves.add(new Curve(overlay.snapshot().name(), zeros.stream().mapToDouble(Complex::getReal).toArray(),
					zeros.stream().mapToDouble(Complex::getImaginary).toArray(), Curve.Style.CIRCLES));
		}
		double[] angles = Places.between(0, 2 * Math.PI, POINTS_OF_CIRCLE, false);
		curves.add(new Curve("unit circle", Arrays.stream(angles).map(Math::cos).toArray(),
				Arrays.stream(angles).map(Math::sin).toArray(), Curve.Style.GUIDE));
		return new Plot(title, new Axis("Real part", ""), new Axis("Imaginary part", ""), curves, List.of(), List.of(),
				new Window(-USUAL_RADIUS, USUAL_RADIUS, -USUAL_RADIUS, USUAL_RADIUS), true, PictureWords.of(title, drawn));
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.widgets.Display;

/** The theme's colours for pictures; their values stand in this bundle's plugin.xml and css folder. UI thread. */
final class ChartColors {

	static final String PREFIX = "tapwright.charts.";
	private static final int CURVES = 6;

	private ChartColors() {
	}

	static Color paper() {
		return get("paper", SWT.COLOR_LIST_BACKGROUND);
	}

	static Color ink() {
		return get("ink", SWT.COLOR_LIST_FOREGROUND);
	}

	static Color grid() {
		return get("grid", SWT.COLOR_WIDGET_LIGHT_SHADOW);
	}

	static Color forbidden() {
		return get("forbidden", SWT.COLOR_WIDGET_NORMAL_SHADOW);
	}

	static Color mark() {
		return get("mark", SWT.COLOR_LIST_FOREGROUND);
	}

	static Color curve(int index) {
		return get("curve" + (Math.floorMod(index, CURVES) + 1), SWT.COLOR_LIST_FOREGROUND);
	}

	// Outside of a workbench there is no theme; the system's colours are always there.
	private static Color get(String name, int system) {
		Color color = JFaceResources.getColorRegistry().get(PREFIX + name);
		return color == null ? Display.getCurrent().getSystemColor(system) : color;
	}
}

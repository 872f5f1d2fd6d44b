// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;

/** Turns mouse and keys into zooms and moves of the cursor. UI thread. */
final class PlotInput {

	private static final double STEP = 1.25;
	private static final int SMALLEST_FRAME = 6;
	private static final int FAST = 10;

	private final PlotView view;
	private final Control area;
	private Point pressed;

	PlotInput(PlotView view, Control area) {
		this.view = view;
		this.area = area;
		area.addListener(SWT.MouseDown, this::down);
		area.addListener(SWT.MouseMove, this::move);
		area.addListener(SWT.MouseUp, this::up);
		area.addListener(SWT.MouseDoubleClick, event -> view.zoomHome());
		area.addListener(SWT.MouseExit, event -> view.setCursor(Double.NaN));
		area.addListener(SWT.MouseVerticalWheel, this::wheel);
		area.addListener(SWT.KeyDown, this::key);
		area.addListener(SWT.FocusIn, event -> area.redraw());
		area.addListener(SWT.FocusOut, event -> area.redraw());
		area.addListener(SWT.Traverse, event -> event.doit = switch (event.detail) {
		case SWT.TRAVERSE_TAB_NEXT, SWT.TRAVERSE_TAB_PREVIOUS, SWT.TRAVERSE_ESCAPE -> true;
		default -> false;
		});
	}

	private void down(Event event) {
		area.setFocus();
		if (event.button == 1) {
			pressed = new Point(event.x, event.y);
		}
	}

	private void move(Event event) {
		view.setCursor(view.at(event.x, event.y)[0]);
		if (pressed != null) {
			view.setZoomFrame(frame(event));
		}
	}

	private Rectangle frame(Event event) {
		return new Rectangle(Math.min(pressed.x, event.x), Math.min(pressed.y, event.y), Math.abs(event.x - pressed.x),
				Math.abs(event.y - pressed.y));
	}

	private void up(Event event) {
		if (pressed == null) {
			return;
		}
		Rectangle frame = frame(event);
		pressed = null;
		view.setZoomFrame(null);
		if (frame.width >= SMALLEST_FRAME && frame.height >= SMALLEST_FRAME) {
			double[] from = view.at(frame.x, frame.y + frame.height);
			double[] to = view.at(frame.x + frame.width, frame.y);
			zoom(from[0], to[0], from[1], to[1]);
		}
	}

	private void wheel(Event event) {
		double[] at = view.at(event.x, event.y);
		double factor = event.count > 0 ? 1 / STEP : STEP;
		boolean valuesOnly = (event.stateMask & SWT.MOD2) != 0;
		scale(at[0], at[1], valuesOnly ? 1 : factor, valuesOnly || view.plot().sameScale() ? factor : 1);
		event.doit = false;
	}

	private void key(Event event) {
		boolean shift = (event.stateMask & SWT.MOD2) != 0;
		int step = shift ? FAST : 1;
		switch (event.keyCode) {
		case SWT.ARROW_LEFT -> moveCursor(-step);
		case SWT.ARROW_RIGHT -> moveCursor(step);
		case SWT.ARROW_UP -> pan(0, 0.1);
		case SWT.ARROW_DOWN -> pan(0, -0.1);
		case SWT.PAGE_UP -> pan(-0.25, 0);
		case SWT.PAGE_DOWN -> pan(0.25, 0);
		case SWT.HOME -> view.zoomHome();
		case SWT.BS -> {
			if (shift) {
				view.zoomForward();
			} else {
				view.zoomBack();
			}
		}
		default -> {
			switch (event.character) {
			case '+', '=' -> zoomAtCursor(1 / STEP);
			case '-' -> zoomAtCursor(STEP);
			default -> {
				// every other key is left to the workbench
			}
			}
		}
		}
	}

	private void moveCursor(int columns) {
		Window window = view.window();
		double place = Double.isNaN(view.cursor()) ? (window.left() + window.right()) / 2 : view.cursor();
		int column = (int) view.projection().column(place) + columns;
		view.setCursor(Math.clamp(view.at(column, 0)[0], window.left(), window.right()));
	}

	private void zoomAtCursor(double factor) {
		Window window = view.window();
		double x = Double.isNaN(view.cursor()) ? (window.left() + window.right()) / 2 : view.cursor();
		scale(x, (window.bottom() + window.top()) / 2, factor, factor);
	}

	private void scale(double x, double y, double horizontal, double vertical) {
		Window next = view.window().scaledAbout(x, y, horizontal, vertical);
		zoom(next.left(), next.right(), next.bottom(), next.top());
	}

	private void pan(double horizontal, double vertical) {
		Window window = view.window();
		Window next = window.moved(horizontal * window.width(), vertical * window.height());
		zoom(next.left(), next.right(), next.bottom(), next.top());
	}

	// Keeps to places that the picture has, and ends where doubles can no longer tell neighbours apart.
	private void zoom(double left, double right, double bottom, double top) {
		Window home = view.plot().home();
		double from = view.plot().sameScale() ? left : Math.clamp(left, home.left(), home.right());
		double to = view.plot().sameScale() ? right : Math.clamp(right, home.left(), home.right());
		if (to - from > 1e-9 * home.width() && top - bottom > 1e-12 * home.height()) {
			view.zoomTo(new Window(from, to, bottom, top));
		}
	}
}

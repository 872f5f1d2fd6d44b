// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import org.eclipse.swt.SWT;
import org.eclipse.swt.events.PaintEvent;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Path;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swtchart.Chart;
import org.eclipse.swtchart.IAxis;
import org.eclipse.swtchart.ICustomPaintListener;

/** Draws what the chart library lacks: forbidden regions, stems, marks, the cursor and the zoom frame. UI thread. */
final class PlotPainter {

	private static final int HATCH_STEP = 9;
	private static final int FAINT = 48;
	private static final int STRONG = 84;
	private static final int MARK_SIZE = 5;

	private final Chart chart;
	private final PlotView view;

	PlotPainter(PlotView view, Chart chart) {
		this.view = view;
		this.chart = chart;
		chart.getPlotArea().addCustomPaintListener(behind(this::paintBehind));
		chart.getPlotArea().addCustomPaintListener(this::paintInFront);
	}

	private static ICustomPaintListener behind(java.util.function.Consumer<PaintEvent> painter) {
		return new ICustomPaintListener() {
			@Override
			public void paintControl(PaintEvent event) {
				painter.accept(event);
			}

			@Override
			public boolean drawBehindSeries() {
				return true;
			}
		};
	}

	/** The mapping of the chart's present axes. */
	Projection projection() {
		IAxis x = chart.getAxisSet().getXAxis(0);
		IAxis y = chart.getAxisSet().getYAxis(0);
		return new Projection() {
			@Override
			public double column(double value) {
				return x.getPixelCoordinate(value);
			}

			@Override
			public double row(double value) {
				return y.getPixelCoordinate(value);
			}
		};
	}

	private void paintBehind(PaintEvent event) {
		Projection projection = projection();
		for (Region region : view.plot().regions()) {
			paintRegion(event.gc, region, projection);
		}
		for (int k = 0; k < view.plot().curves().size(); k++) {
			if (view.plot().curves().get(k).style() == Curve.Style.STEMS) {
				paintStems(event.gc, k, projection);
			}
		}
	}

	private void paintRegion(GC gc, Region region, Projection projection) {
		double[] corners = projection.corners(region, view.window());
		if (corners.length == 0) {
			return;
		}
		Rectangle clip = gc.getClipping();
		Path path = new Path(gc.getDevice());
		path.moveTo((float) corners[0], (float) corners[1]);
		for (int k = 2; k < corners.length; k += 2) {
			path.lineTo((float) corners[k], (float) corners[k + 1]);
		}
		path.close();
		gc.setAntialias(SWT.ON);
		gc.setBackground(ChartColors.forbidden());
		gc.setForeground(ChartColors.forbidden());
		gc.setAlpha(region.emphasized() ? STRONG : FAINT);
		gc.fillPath(path);
		gc.setClipping(path);
		gc.setLineWidth(1);
		gc.setAlpha(STRONG);
		Point size = chart.getPlotArea().getSize();
		for (int start = -size.y; start < size.x; start += HATCH_STEP) {
			gc.drawLine(start, size.y, start + size.y, 0);
		}
		gc.setClipping(clip);
		path.dispose();
		gc.setAlpha(255);
		gc.setLineWidth(region.emphasized() ? 3 : 2);
		for (int k = 2; k + 5 < corners.length; k += 2) {
			gc.drawLine((int) corners[k], (int) corners[k + 1], (int) corners[k + 2], (int) corners[k + 3]);
		}
		gc.setLineWidth(1);
	}

	private void paintStems(GC gc, int index, Projection projection) {
		Curve curve = view.plot().curves().get(index);
		gc.setForeground(ChartColors.curve(index));
		int zero = (int) projection.row(0);
		for (int k = 0; k < curve.x().length; k++) {
			int column = (int) projection.column(curve.x()[k]);
			gc.drawLine(column, zero, column, (int) projection.row(curve.y()[k]));
		}
	}

	private void paintInFront(PaintEvent event) {
		GC gc = event.gc;
		gc.setAntialias(SWT.ON);
		Projection projection = projection();
		for (Mark mark : view.plot().marks()) {
			paintMark(gc, mark, projection);
		}
		Point size = chart.getPlotArea().getSize();
		double cursor = view.cursor();
		if (!Double.isNaN(cursor)) {
			gc.setForeground(ChartColors.ink());
			gc.setLineStyle(SWT.LINE_DOT);
			int column = (int) projection.column(cursor);
			gc.drawLine(column, 0, column, size.y);
			gc.setLineStyle(SWT.LINE_SOLID);
		}
		Rectangle frame = view.zoomFrame();
		if (frame != null) {
			gc.setForeground(ChartColors.ink());
			gc.setBackground(ChartColors.curve(0));
			gc.setAlpha(FAINT);
			gc.fillRectangle(frame);
			gc.setAlpha(255);
			gc.drawRectangle(frame);
		}
		if (view.isShownFocused()) {
			gc.setForeground(ChartColors.ink());
			gc.setAlpha(STRONG);
			gc.drawRectangle(0, 0, size.x - 1, size.y - 1);
			gc.setAlpha(255);
		}
	}

	private void paintMark(GC gc, Mark mark, Projection projection) {
		Window window = view.window();
		if (mark.x() < window.left() || mark.x() > window.right()) {
			return;
		}
		Point size = chart.getPlotArea().getSize();
		int column = (int) projection.column(mark.x());
		int row = Math.clamp((long) projection.row(mark.y()), MARK_SIZE, Math.max(MARK_SIZE, size.y - MARK_SIZE - 1));
		gc.setForeground(mark.grave() ? ChartColors.mark() : ChartColors.ink());
		gc.setLineWidth(2);
		if (mark.grave()) {
			gc.drawLine(column - MARK_SIZE, row - MARK_SIZE, column + MARK_SIZE, row + MARK_SIZE);
			gc.drawLine(column - MARK_SIZE, row + MARK_SIZE, column + MARK_SIZE, row - MARK_SIZE);
		} else {
			gc.drawPolygon(new int[] { column, row - MARK_SIZE, column + MARK_SIZE, row, column, row + MARK_SIZE,
					column - MARK_SIZE, row });
		}
		gc.setLineWidth(1);
		if (!mark.label().isEmpty()) {
			paintLabel(gc, mark.label(), column, row, size);
		}
	}

	private static void paintLabel(GC gc, String label, int column, int row, Point size) {
		Point extent = gc.textExtent(label);
		int gap = 2 * MARK_SIZE;
		int left = column + gap + extent.x > size.x ? column - gap - extent.x : column + gap;
		int top = Math.clamp(row - extent.y - 2L, 0, Math.max(0, size.y - extent.y));
		gc.setBackground(ChartColors.paper());
		gc.setAlpha(210);
		gc.fillRectangle(left - 3, top, extent.x + 6, extent.y);
		gc.setAlpha(255);
		gc.drawText(label, left, top, true);
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

import java.text.FieldPosition;
import java.text.Format;
import java.text.ParsePosition;
import java.util.function.Consumer;

import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.util.IPropertyChangeListener;
import org.eclipse.swt.SWT;
import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleEvent;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swtchart.Chart;
import org.eclipse.swtchart.IAxis;
import org.eclipse.swtchart.ILineSeries;
import org.eclipse.swtchart.ISeries;
import org.eclipse.swtchart.LineStyle;
import org.eclipse.swtchart.Range;

/**
 * Shows a {@link Plot}: zoom with history, a cursor with readout, a menu to copy and save, all reachable from the keyboard. UI
 * thread only.
 */
public final class PlotView extends Composite {

	// The workbench's style sheets would paint over the colours of the pictures.
	private static final String WITHOUT_STYLE_SHEET = "org.eclipse.e4.ui.css.disabled";
	private static final int VALUE_TICK_PIXELS = 30;
	private static final LineStyle[] STYLES = { LineStyle.SOLID, LineStyle.DASH, LineStyle.DASHDOT, LineStyle.DOT,
			LineStyle.DASHDOTDOT };

	private final Chart chart;
	private final Label readout;
	private final PlotPainter painter;
	private final ZoomHistory history = new ZoomHistory();
	private final IPropertyChangeListener themeListener = event -> {
		if (event.getProperty().startsWith(ChartColors.PREFIX)) {
			applyColors();
		}
	};
	private Plot plot = Plot.of("", new Axis("", ""), new Axis("", ""), java.util.List.of(), new Window(0, 1, 0, 1), "");
	private Window window = plot.home();
	private double cursor = Double.NaN;
	private Rectangle zoomFrame;
	private Consumer<Window> windowListener = shown -> {
	};

	/** An empty picture. */
	public PlotView(Composite parent) {
		super(parent, SWT.NONE);
		GridLayoutFactory.fillDefaults().spacing(0, 0).applyTo(this);
		setData(WITHOUT_STYLE_SHEET, Boolean.TRUE);
		chart = new Chart(this, SWT.DOUBLE_BUFFERED);
		chart.setData(WITHOUT_STYLE_SHEET, Boolean.TRUE);
		chart.getPlotArea().getControl().setData(WITHOUT_STYLE_SHEET, Boolean.TRUE);
		chart.getTitle().setVisible(false);
		chart.getLegend().setPosition(SWT.TOP);
		GridDataFactory.fillDefaults().grab(true, true).hint(200, 60).applyTo(chart);
		readout = new Label(this, SWT.NONE);
		readout.setData(WITHOUT_STYLE_SHEET, Boolean.TRUE);
		GridDataFactory.fillDefaults().grab(true, false).indent(8, 0).applyTo(readout);
		for (IAxis axis : chart.getAxisSet().getAxes()) {
			axis.getGrid().setStyle(LineStyle.SOLID);
			axis.getTitle().setFont(JFaceResources.getDialogFont());
			axis.getTick().setFont(JFaceResources.getDialogFont());
			axis.setDrawPositionMarker(false);
		}
		yAxis().getTick().setTickMarkStepHint(VALUE_TICK_PIXELS);
		painter = new PlotPainter(this, chart);
		new PlotInput(this, area());
		new PlotMenu(this, area());
		describeForScreenReaders();
		area().addListener(SWT.Resize, event -> resized());
		JFaceResources.getColorRegistry().addListener(themeListener);
		addDisposeListener(event -> JFaceResources.getColorRegistry().removeListener(themeListener));
		applyColors();
		rebuild();
	}

	private void describeForScreenReaders() {
		area().getAccessible().addAccessibleListener(new AccessibleAdapter() {
			@Override
			public void getName(AccessibleEvent event) {
				event.result = plot.title();
			}

			@Override
			public void getDescription(AccessibleEvent event) {
				event.result = description();
			}
		});
	}

	/** Shows a picture; a zoom that a person chose stays as long as the axes are the same. */
	public void show(Plot next) {
		boolean sameAxes = next.x().equals(plot.x()) && next.y().equals(plot.y());
		boolean zoomed = sameAxes && !window.equals(plot.home());
		plot = next;
		if (!zoomed) {
			window = next.home();
			history.clear();
		}
		rebuild();
	}

	/** The picture shown. */
	public Plot plot() {
		return plot;
	}

	/** The part of the plane shown. */
	public Window window() {
		return window;
	}

	/** Tells when another part of the plane is shown; one listener. */
	public void onWindowChange(Consumer<Window> listener) {
		windowListener = listener;
	}

	/** Shows another part of the plane; the present one can be brought back. */
	public void zoomTo(Window next) {
		if (next.equals(window)) {
			return;
		}
		history.leave(window);
		setWindow(next);
	}

	/** Shows everything. */
	public void zoomHome() {
		zoomTo(plot.home());
	}

	/** Shows what was shown before. */
	public void zoomBack() {
		history.back(window).ifPresent(this::setWindow);
	}

	/** Undoes {@link #zoomBack()}. */
	public void zoomForward() {
		history.forward(window).ifPresent(this::setWindow);
	}

	private void setWindow(Window next) {
		window = next;
		applyWindow();
		drawCurves();
		windowListener.accept(next);
	}

	/** Place of the cursor; NaN when there is none. */
	public double cursor() {
		return cursor;
	}

	/** Puts the cursor at a place; NaN takes it away. */
	public void setCursor(double place) {
		cursor = place;
		readout.setText(Double.isNaN(place) ? "" : Readout.at(plot, place));
		area().redraw();
	}

	/** The picture in words, with what the cursor reads. */
	public String description() {
		return Double.isNaN(cursor) ? plot.text() : plot.text() + " Cursor: " + readout.getText();
	}

	/** The control that takes the keys. */
	public Control area() {
		return chart.getPlotArea().getControl();
	}

	@Override
	public boolean setFocus() {
		return area().setFocus();
	}

	/** The picture as pixels; the caller disposes it. */
	Image image() {
		Rectangle bounds = chart.getClientArea();
		var image = new Image(getDisplay(), Math.max(1, bounds.width), Math.max(1, bounds.height));
		chart.renderOffscreenImage(image);
		return image;
	}

	Rectangle zoomFrame() {
		return zoomFrame;
	}

	void setZoomFrame(Rectangle frame) {
		zoomFrame = frame;
		area().redraw();
	}

	boolean isShownFocused() {
		return area().isFocusControl();
	}

	/** Place and value under a pixel. */
	double[] at(int column, int row) {
		return new double[] { xAxis().getDataCoordinate(column), yAxis().getDataCoordinate(row) };
	}

	Projection projection() {
		return painter.projection();
	}

	private IAxis xAxis() {
		return chart.getAxisSet().getXAxis(0);
	}

	private IAxis yAxis() {
		return chart.getAxisSet().getYAxis(0);
	}

	private void rebuild() {
		chart.suspendUpdate(true);
		for (ISeries<?> series : chart.getSeriesSet().getSeries()) {
			chart.getSeriesSet().deleteSeries(series.getId());
		}
		xAxis().enableLogScale(false);
		applyWindow();
		xAxis().enableLogScale(plot.x().logarithmic());
		for (int k = 0; k < plot.curves().size(); k++) {
			addSeries(k, plot.curves().get(k));
		}
		long named = plot.curves().stream().filter(curve -> curve.style() != Curve.Style.GUIDE).count();
		chart.getLegend().setVisible(named > 1);
		chart.suspendUpdate(false);
		drawCurves();
		setCursor(cursor);
		area().setToolTipText(null);
	}

	private void addSeries(int index, Curve curve) {
		var line = (ILineSeries<?>) chart.getSeriesSet().createSeries(ISeries.SeriesType.LINE, "curve" + index);
		line.setDescription(curve.label());
		line.setVisibleInLegend(curve.style() != Curve.Style.GUIDE);
		line.setAntialias(SWT.ON);
		line.setLineWidth(curve.style() == Curve.Style.GUIDE ? 1 : 2);
		line.setLineStyle(curve.isLine() ? STYLES[index % STYLES.length] : LineStyle.NONE);
		line.setSymbolType(switch (curve.style()) {
		case LINE, GUIDE -> ILineSeries.PlotSymbolType.NONE;
		case STEMS, CIRCLES -> ILineSeries.PlotSymbolType.CIRCLE;
		case CROSSES -> ILineSeries.PlotSymbolType.CROSS;
		});
		line.setSymbolSize(curve.style() == Curve.Style.STEMS ? 2 : 4);
		color(index, curve, line);
	}

	private static void color(int index, Curve curve, ILineSeries<?> line) {
		Color color = curve.style() == Curve.Style.GUIDE ? ChartColors.ink() : ChartColors.curve(index);
		line.setLineColor(color);
		line.setSymbolColor(color);
	}

	private void resized() {
		if (plot.sameScale()) {
			applyWindow();
		}
		drawCurves();
	}

	/** The window, widened where both axes must have the same scale. */
	private Window shown() {
		Point size = area().getSize();
		if (!plot.sameScale() || size.x < 2 || size.y < 2) {
			return window;
		}
		double unit = Math.max(window.width() / size.x, window.height() / size.y);
		double middleX = (window.left() + window.right()) / 2;
		double middleY = (window.bottom() + window.top()) / 2;
		return new Window(middleX - unit * size.x / 2, middleX + unit * size.x / 2, middleY - unit * size.y / 2,
				middleY + unit * size.y / 2);
	}

	/** Hands the chart no more points than its pixels can show. */
	private void drawCurves() {
		if (isDisposed() || plot.curves().isEmpty()) {
			return;
		}
		int columns = Math.max(50, area().getSize().x);
		chart.suspendUpdate(true);
		for (int k = 0; k < plot.curves().size(); k++) {
			Curve curve = plot.curves().get(k);
			Curve drawn = curve.isLine() && !plot.sameScale()
					? Decimation.reduce(curve, window.left(), window.right(), columns, plot.x().logarithmic())
					: curve;
			ISeries<?> series = chart.getSeriesSet().getSeries("curve" + k);
			series.setXSeries(drawn.x());
			series.setYSeries(drawn.y());
		}
		chart.suspendUpdate(false);
		chart.redraw();
	}

	private void applyWindow() {
		boolean suspended = chart.isUpdateSuspended();
		chart.suspendUpdate(true);
		Window shown = shown();
		apply(xAxis(), plot.x(), shown.left(), shown.right());
		apply(yAxis(), plot.y(), shown.bottom(), shown.top());
		if (!suspended) {
			chart.suspendUpdate(false);
		}
	}

	private static void apply(IAxis axis, Axis meaning, double from, double to) {
		axis.setRange(new Range(from, to));
		int power = meaning.prefixPower(Math.max(Math.abs(from), Math.abs(to)));
		axis.getTitle().setText(meaning.caption(power));
		axis.getTick().setFormat(new TickFormat(Math.pow(10, power), to - from));
	}

	private void applyColors() {
		Color paper = ChartColors.paper();
		Color ink = ChartColors.ink();
		setBackground(paper);
		chart.setBackground(paper);
		chart.getPlotArea().setBackground(paper);
		chart.getLegend().setBackground(paper);
		chart.getLegend().setForeground(ink);
		readout.setBackground(paper);
		readout.setForeground(ink);
		for (IAxis axis : chart.getAxisSet().getAxes()) {
			axis.getTick().setForeground(ink);
			axis.getTitle().setForeground(ink);
			axis.getGrid().setForeground(ChartColors.grid());
		}
		for (int k = 0; k < plot.curves().size(); k++) {
			if (chart.getSeriesSet().getSeries("curve" + k) instanceof ILineSeries<?> line) {
				color(k, plot.curves().get(k), line);
			}
		}
		chart.redraw();
	}

	/** Writes tick values in the prefixed unit of the axis, without digits that the range does not need. */
	private static final class TickFormat extends Format {

		private static final long serialVersionUID = 1L;
		private final double unit;
		private final double extent;

		TickFormat(double unit, double extent) {
			this.unit = unit;
			this.extent = extent;
		}

		@Override
		public StringBuffer format(Object value, StringBuffer out, FieldPosition position) {
			double number = ((Number) value).doubleValue();
			int digits = (int) Math.ceil(Math.log10(Math.max(1, Math.abs(number) / extent))) + 3;
			return out.append(Ticks.format(Math.abs(number) < 1e-9 * extent ? 0 : number / unit, digits));
		}

		// The chart reads its own labels back to find those that stand for more than they show.
		@Override
		public Object parseObject(String text, ParsePosition position) {
			position.setIndex(text.length());
			return Double.parseDouble(text.replace('−', '-')) * unit;
		}
	}
}

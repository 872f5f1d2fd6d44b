// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.picture;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.function.Consumer;

import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.IJobFunction;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.ToolBar;
import org.eclipse.swt.widgets.ToolItem;

import tapwright.charts.Plot;
import tapwright.charts.PlotView;
import tapwright.charts.Window;
import tapwright.core.verify.RequirementEvidence;
import tapwright.ui.look.Icons;

/** A picture of filters with its tool bar. Computes in the background; the newest request wins. UI thread. */
public final class PicturePane extends Composite {

	// Zooming in by more than this asks for more points.
	private static final double CLOSE = 0.3;

	private final PlotView view;
	private final Composite tools;
	private ToolItem passBand;
	private List<Overlay> overlays = List.of();
	private PictureStyle style = PictureStyle.USUAL;
	private String emphasized = "";
	private Job job;
	private int request;
	private Optional<RequirementEvidence> wanted = Optional.empty();

	/** An empty pane. */
	public PicturePane(Composite parent) {
		super(parent, SWT.NONE);
		GridLayoutFactory.fillDefaults().spacing(0, 0).applyTo(this);
		tools = new Composite(this, SWT.NONE);
		GridLayoutFactory.fillDefaults().numColumns(2).spacing(6, 0).applyTo(tools);
		GridDataFactory.fillDefaults().applyTo(tools);
		fillToggles(new ToolBar(tools, SWT.FLAT | SWT.HORIZONTAL)); // apart: text without icons would leave holes for them
		fillButtons(new ToolBar(tools, SWT.FLAT | SWT.HORIZONTAL | SWT.RIGHT));
		view = new PlotView(this);
		GridDataFactory.fillDefaults().grab(true, true).applyTo(view);
		view.onWindowChange(this::windowChanged);
		addDisposeListener(event -> cancel());
	}

	private void fillToggles(ToolBar bar) {
		toggle(bar, "dB", "Gain in decibels, otherwise as a plain number", style.decibels(),
				on -> setStyle(new PictureStyle(style.kind(), on, style.logarithmic())));
		toggle(bar, "log f", "Frequencies spread by their logarithm", style.logarithmic(),
				on -> setStyle(new PictureStyle(style.kind(), style.decibels(), on)));
	}

	private void fillButtons(ToolBar bar) {
		button(bar, Icons.HOME, "", "Show everything (Home)", () -> view.zoomHome());
		button(bar, Icons.BACK, "", "Previous zoom (Backspace)", () -> view.zoomBack());
		passBand = button(bar, Icons.RESPONSE, "Pass band", "Show the bands that have a lower limit", this::zoomToPassBand);
	}

	private static void toggle(ToolBar bar, String text, String tip, boolean selected, Consumer<Boolean> action) {
		var item = new ToolItem(bar, SWT.CHECK);
		item.setText(text);
		item.setToolTipText(tip);
		item.setSelection(selected);
		item.addListener(SWT.Selection, event -> action.accept(item.getSelection()));
	}

	private static ToolItem button(ToolBar bar, String icon, String text, String tip, Runnable action) {
		var item = new ToolItem(bar, SWT.PUSH);
		item.setImage(Icons.get(icon));
		item.setText(text);
		item.setToolTipText(tip);
		item.addListener(SWT.Selection, event -> action.run());
		return item;
	}

	/** Hides the tool bar, where a picture is only a glance. */
	public void hideTools() {
		((GridData) tools.getLayoutData()).exclude = true;
		tools.setVisible(false);
	}

	/** Shows filters. */
	public void show(List<Overlay> next) {
		if (!overlays.equals(next)) {
			overlays = List.copyOf(next);
			compute(null);
		}
	}

	/** What is shown. */
	public PictureStyle style() {
		return style;
	}

	/** Shows something else of the same filters. */
	public void setStyle(PictureStyle next) {
		if (!style.equals(next)) {
			style = next;
			passBand.setEnabled(style.kind() == PictureKind.MAGNITUDE);
			compute(null);
		}
	}

	/** Makes the limit of a requirement stand out; empty for none. */
	public void emphasize(String requirement) {
		if (!emphasized.equals(Objects.requireNonNullElse(requirement, ""))) {
			emphasized = Objects.requireNonNullElse(requirement, "");
			compute(null);
		}
	}

	/** Shows the surroundings of a requirement's worst place, and puts the cursor there. */
	public void lookAt(RequirementEvidence evidence) {
		wanted = Optional.of(evidence);
		if (style.kind() != PictureKind.MAGNITUDE) {
			style = style.with(PictureKind.MAGNITUDE);
		}
		emphasized = evidence.id();
		compute(null);
	}

	/** The picture itself. */
	public PlotView view() {
		return view;
	}

	@Override
	public boolean setFocus() {
		return view.setFocus();
	}

	private void cancel() {
		request++;
		if (job != null) {
			job.cancel();
		}
	}

	private void compute(Window detail) {
		cancel();
		int number = request;
		List<Overlay> drawn = overlays;
		PictureStyle drawnStyle = style;
		String drawnEmphasized = emphasized;
		job = Job.create("Drawing", (IJobFunction) monitor -> compute(drawn, drawnStyle, drawnEmphasized, detail, number, monitor));
		job.setSystem(true);
		job.setPriority(Job.INTERACTIVE);
		job.schedule();
	}

	// job thread
	private IStatus compute(List<Overlay> drawn, PictureStyle drawnStyle, String drawnEmphasized, Window detail, int number,
			IProgressMonitor monitor) {
		Plot plot = Pictures.of(drawn, drawnStyle, drawnEmphasized, detail);
		if (monitor.isCanceled() || isDisposed()) {
			return Status.CANCEL_STATUS;
		}
		getDisplay().asyncExec(() -> {
			if (!isDisposed() && number == request) {
				arrived(plot);
			}
		});
		return Status.OK_STATUS;
	}

	private void arrived(Plot plot) {
		view.show(plot);
		passBand.setEnabled(Pictures.passBand(plot).isPresent());
		wanted.ifPresent(evidence -> {
			double place = evidence.proof().worst();
			if (evidence.placeUnit().equals("Hz") && !Double.isNaN(place)) {
				plot.curves().stream().findFirst().ifPresent(
						curve -> view.zoomTo(Pictures.around(plot, place, curve.y()[curve.nearest(place)],
								evidence.proof().margin().middle())));
				view.setCursor(place);
			}
		});
		wanted = Optional.empty();
	}

	private void zoomToPassBand() {
		Pictures.passBand(view.plot()).ifPresent(view::zoomTo);
	}

	private void windowChanged(Window window) {
		if (style.kind().isOverFrequency() && window.width() < CLOSE * view.plot().home().width()) {
			compute(window);
		}
	}
}

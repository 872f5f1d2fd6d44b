// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.wizard;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.Adapters;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.viewers.IStructuredSelection;
import org.eclipse.jface.wizard.WizardPage;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Words;
import tapwright.model.ModelPackage;
import tapwright.model.io.ModelFiles;
import tapwright.workspace.PortfolioProject;

/** Asks for portfolio, name, sample rate and purpose of a new filter. */
final class NewFilterPage extends WizardPage {

	private static final int LINES_OF_PURPOSE = 4;

	private final IStructuredSelection selection;
	private List<IProject> portfolios = List.of();
	private Combo portfolio;
	private Text name;
	private Text rate;
	private Label rateMeaning;
	private Text purpose;

	NewFilterPage(IStructuredSelection selection) {
		super("filter");
		this.selection = selection;
		setTitle("Filter");
		setDescription("Name the filter and say at which rate it runs. Requirements and coefficients follow in its editor.");
	}

	@Override
	public void createControl(Composite parent) {
		var area = new Composite(parent, SWT.NONE);
		GridLayoutFactory.swtDefaults().numColumns(2).spacing(10, 8).applyTo(area);
		label(area, "&Portfolio:");
		portfolio = new Combo(area, SWT.READ_ONLY | SWT.DROP_DOWN);
		GridDataFactory.fillDefaults().grab(true, false).applyTo(portfolio);
		label(area, "&Name:");
		name = text(area, SWT.SINGLE, 1);
		label(area, "&Sample rate:");
		rate = text(area, SWT.SINGLE, 1);
		rate.setMessage("48 kHz, or a parameter of the portfolio");
		new Label(area, SWT.NONE);
		rateMeaning = new Label(area, SWT.NONE);
		GridDataFactory.fillDefaults().grab(true, false).applyTo(rateMeaning);
		label(area, "P&urpose:");
		purpose = text(area, SWT.MULTI | SWT.WRAP | SWT.V_SCROLL, LINES_OF_PURPOSE);
		fillPortfolios();
		portfolio.addListener(SWT.Selection, event -> validate());
		name.addListener(SWT.Modify, event -> validate());
		rate.addListener(SWT.Modify, event -> validate());
		setControl(area);
		validate();
		setErrorMessage(null); // nothing is wrong before anything was typed
		name.setFocus();
	}

	private static void label(Composite parent, String text) {
		var label = new Label(parent, SWT.NONE);
		label.setText(text);
		GridDataFactory.swtDefaults().align(SWT.BEGINNING, SWT.CENTER).applyTo(label);
	}

	private static Text text(Composite parent, int style, int lines) {
		var text = new Text(parent, style | SWT.BORDER);
		int height = lines > 1 ? lines * text.getLineHeight() : SWT.DEFAULT;
		GridDataFactory.fillDefaults().grab(true, lines > 1).hint(SWT.DEFAULT, height).applyTo(text);
		return text;
	}

	private void fillPortfolios() {
		portfolios = Arrays.stream(ResourcesPlugin.getWorkspace().getRoot().getProjects())
				.filter(project -> PortfolioProject.of(project).isPresent()).toList();
		portfolios.forEach(project -> portfolio.add(project.getName()));
		IResource selected = Adapters.adapt(selection.getFirstElement(), IResource.class);
		int index = selected == null ? -1 : portfolios.indexOf(selected.getProject());
		if (!portfolios.isEmpty()) {
			portfolio.select(Math.max(0, index));
		}
	}

	private void validate() {
		Optional<String> problem = problem();
		setErrorMessage(problem.orElse(null));
		setPageComplete(problem.isEmpty());
	}

	private Optional<String> problem() {
		rateMeaning.setText("");
		if (portfolios.isEmpty()) {
			return Optional.of("There is no portfolio yet; make one first with File > New > Portfolio.");
		}
		if (filterName().isEmpty()) {
			return Optional.of("Give the filter a name.");
		}
		if (!filterName().matches("[A-Za-z0-9][A-Za-z0-9 _.+-]*")) {
			return Optional.of("The name must be made of letters, digits, spaces and . _ + - so that files can be named after it.");
		}
		if (file().exists()) {
			return Optional.of("The portfolio has a filter with this name already.");
		}
		return rateProblem();
	}

	private Optional<String> rateProblem() {
		if (sampleRate().isEmpty()) {
			return Optional.of("Give the sample rate at the input of the filter.");
		}
		try {
			double hertz = new Numbers(new PortfolioProject(project()).parameters()).evaluate(sampleRate(),
					ModelPackage.Literals.FILTER__SAMPLE_RATE);
			rateMeaning.setText(Words.exactly(hertz, "Hz"));
			return hertz > 0 ? Optional.empty() : Optional.of("The sample rate must be greater than zero.");
		} catch (InputException e) {
			return Optional.of("Sample rate: " + e.getMessage());
		}
	}

	private IProject project() {
		return portfolios.get(portfolio.getSelectionIndex());
	}

	IFile file() {
		return project().getFile(filterName() + "." + ModelFiles.FILTER_EXTENSION);
	}

	String filterName() {
		return name.getText().strip();
	}

	String sampleRate() {
		return rate.getText().strip();
	}

	String purpose() {
		return purpose.getText().isBlank() ? null : purpose.getText().strip();
	}
}

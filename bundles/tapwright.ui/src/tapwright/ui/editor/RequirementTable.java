// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;

import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.viewers.ArrayContentProvider;
import org.eclipse.jface.viewers.ColumnLabelProvider;
import org.eclipse.jface.viewers.ColumnViewerToolTipSupport;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.jface.viewers.TableViewer;
import org.eclipse.jface.viewers.TableViewerColumn;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.meta.Meta;
import tapwright.core.verify.InputProblem;
import tapwright.core.verify.RequirementEvidence;
import tapwright.dsp.verify.Verdict;
import tapwright.model.Requirement;
import tapwright.ui.look.Icons;
import tapwright.ui.look.Verdicts;
import tapwright.ui.proof.Proven;

/** The list of a filter's requirements with what was proven of each. UI thread. */
final class RequirementTable {

	private final FilterEditor editor;
	private final TableViewer viewer;
	private Optional<Proven> proven = Optional.empty();

	RequirementTable(FilterEditor editor, FormToolkit toolkit, Composite parent, Consumer<Requirement> selected) {
		this.editor = editor;
		GridLayoutFactory.fillDefaults().margins(2, 2).spacing(0, 2).applyTo(parent);
		var commands = new RequirementCommands(editor, this);
		commands.createToolBar(parent);
		var table = toolkit.createTable(parent, SWT.FULL_SELECTION | SWT.MULTI | SWT.BORDER);
		table.setHeaderVisible(true);
		GridDataFactory.fillDefaults().grab(true, true).hint(300, 4 * table.getItemHeight()).applyTo(table);
		viewer = new TableViewer(table);
		viewer.setContentProvider(ArrayContentProvider.getInstance());
		ColumnViewerToolTipSupport.enableFor(viewer);
		column("Id", 95, Requirement::getId, this::image);
		column("Statement", 300, this::statement, requirement -> null);
		column("Margin", 95, requirement -> found(requirement).map(Verdicts::margin).orElse(""), requirement -> null);
		column("Verdict", 90, this::verdict, requirement -> null);
		viewer.addSelectionChangedListener(event -> {
			commands.update();
			selected.accept((Requirement) viewer.getStructuredSelection().getFirstElement());
		});
		commands.bindKeys(table);
	}

	private void column(String title, int width, Function<Requirement, String> text, Function<Requirement, Image> image) {
		var column = new TableViewerColumn(viewer, SWT.NONE);
		column.getColumn().setText(title);
		column.getColumn().setWidth(width);
		column.setLabelProvider(new ColumnLabelProvider() {
			@Override
			public String getText(Object element) {
				return text.apply((Requirement) element);
			}

			@Override
			public Image getImage(Object element) {
				return image.apply((Requirement) element);
			}

			@Override
			public String getToolTipText(Object element) {
				return found((Requirement) element).map(RequirementEvidence::message)
						.or(() -> problem((Requirement) element)).orElse(null);
			}
		});
	}

	private Optional<RequirementEvidence> found(Requirement requirement) {
		return proven.flatMap(known -> known.evidence().find(String.valueOf(requirement.getId())));
	}

	private Optional<String> problem(Requirement requirement) {
		return proven.stream().flatMap(known -> known.evidence().problems().stream())
				.filter(problem -> problem.requirement().equals(requirement.getId())).map(InputProblem::message).findFirst();
	}

	private String statement(Requirement requirement) {
		return found(requirement).map(RequirementEvidence::description)
				.or(() -> problem(requirement)).orElse(Meta.label(requirement.eClass()));
	}

	private Image image(Requirement requirement) {
		if (proven.isEmpty() || proven.get().stale()) {
			return Icons.get(Icons.STALE);
		}
		return Verdicts.image(found(requirement).map(known -> known.proof().verdict()).orElse(Verdict.UNPROVEN));
	}

	private String verdict(Requirement requirement) {
		if (proven.isEmpty() || proven.get().stale()) {
			return "proving";
		}
		return found(requirement).map(known -> Verdicts.word(known.proof().verdict()))
				.orElse(problem(requirement).isPresent() ? "to correct" : "");
	}

	/** Shows what the model and the evidence have now. */
	void refresh(Optional<Proven> next) {
		proven = next;
		List<Requirement> requirements = List.copyOf(editor.document().root().getRequirements());
		var selection = viewer.getStructuredSelection();
		if (requirements.equals(viewer.getInput())) {
			viewer.refresh();
			return;
		}
		viewer.setInput(requirements);
		viewer.setSelection(selection, false);
		if (viewer.getStructuredSelection().isEmpty() && !requirements.isEmpty()) {
			viewer.setSelection(new StructuredSelection(requirements.getFirst()));
		}
	}

	/** Selects a requirement by its id. */
	void select(String id) {
		editor.document().root().getRequirements().stream().filter(requirement -> id.equals(requirement.getId()))
				.findFirst().ifPresent(this::select);
	}

	/** Selects a requirement. */
	void select(Requirement requirement) {
		viewer.setSelection(new StructuredSelection(requirement), true);
	}

	/** The selected requirements in the order of the filter. */
	List<Requirement> selected() {
		List<?> chosen = viewer.getStructuredSelection().toList();
		return editor.document().root().getRequirements().stream().filter(chosen::contains).toList();
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;

import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.viewers.ArrayContentProvider;
import org.eclipse.jface.viewers.ColumnLabelProvider;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.jface.viewers.TableViewer;
import org.eclipse.jface.viewers.TableViewerColumn;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.verify.RequirementEvidence;
import tapwright.ui.look.Icons;
import tapwright.ui.look.Verdicts;
import tapwright.ui.proof.Proven;

/** Requirement by verdict, margin, worst value, worst place and limit. UI thread. */
final class EvidenceTable {

	private final TableViewer viewer;
	private boolean stale;
	private boolean filling;

	EvidenceTable(FormToolkit toolkit, Composite parent, Consumer<Optional<RequirementEvidence>> selected) {
		var table = toolkit.createTable(parent, SWT.FULL_SELECTION | SWT.SINGLE | SWT.BORDER);
		table.setHeaderVisible(true);
		GridDataFactory.fillDefaults().grab(true, true).hint(400, 4 * table.getItemHeight()).applyTo(table);
		viewer = new TableViewer(table);
		viewer.setContentProvider(ArrayContentProvider.getInstance());
		column("Requirement", 120, SWT.LEFT, RequirementEvidence::id, this::image);
		column("Verdict", 90, SWT.LEFT, found -> stale ? "proving" : Verdicts.word(found.proof().verdict()), found -> null);
		column("Margin", 100, SWT.RIGHT, Verdicts::margin, found -> null);
		column("Worst value", 110, SWT.RIGHT, Verdicts::value, found -> null);
		column("At", 110, SWT.RIGHT, Verdicts::place, found -> null);
		column("Limit", 100, SWT.RIGHT, Verdicts::limit, found -> null);
		column("Statement", 380, SWT.LEFT, RequirementEvidence::description, found -> null);
		viewer.addSelectionChangedListener(event -> {
			if (!filling) {
				selected.accept(Optional.ofNullable((RequirementEvidence) viewer.getStructuredSelection().getFirstElement()));
			}
		});
	}

	private void column(String title, int width, int alignment, Function<RequirementEvidence, String> text,
			Function<RequirementEvidence, Image> image) {
		var column = new TableViewerColumn(viewer, alignment);
		column.getColumn().setText(title);
		column.getColumn().setWidth(width);
		column.setLabelProvider(new ColumnLabelProvider() {
			@Override
			public String getText(Object element) {
				return text.apply((RequirementEvidence) element);
			}

			@Override
			public Image getImage(Object element) {
				return image.apply((RequirementEvidence) element);
			}
		});
	}

	private Image image(RequirementEvidence found) {
		return stale ? Icons.get(Icons.STALE) : Verdicts.image(found.proof().verdict());
	}

	/** Shows evidence; the selection stays with the requirement. */
	void show(Proven proven) {
		String id = viewer.getStructuredSelection().getFirstElement() instanceof RequirementEvidence found ? found.id() : null;
		stale = proven.stale();
		filling = true;
		viewer.setInput(proven.evidence().requirements());
		filling = false;
		if (id != null) {
			filling = true;
			select(id);
			filling = false;
		}
	}

	/** Selects a requirement by its id. */
	void select(String id) {
		((List<?>) viewer.getInput()).stream().map(RequirementEvidence.class::cast).filter(found -> found.id().equals(id))
				.findFirst().ifPresent(found -> viewer.setSelection(new StructuredSelection(found), true));
	}
}

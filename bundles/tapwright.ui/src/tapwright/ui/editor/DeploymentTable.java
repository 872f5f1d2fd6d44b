// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.List;
import java.util.Objects;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.edit.command.AddCommand;
import org.eclipse.emf.edit.command.DeleteCommand;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.viewers.ArrayContentProvider;
import org.eclipse.jface.viewers.CellEditor;
import org.eclipse.jface.viewers.ColumnLabelProvider;
import org.eclipse.jface.viewers.EditingSupport;
import org.eclipse.jface.viewers.TableViewer;
import org.eclipse.jface.viewers.TableViewerColumn;
import org.eclipse.jface.viewers.TextCellEditor;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.InputException;
import tapwright.core.meta.Meta;
import tapwright.core.quantity.Numbers;
import tapwright.model.Deployment;
import tapwright.model.Filter;
import tapwright.model.ModelFactory;
import tapwright.model.ModelPackage;
import tapwright.ui.field.FeatureWords;

/** Where a filter runs: one row for each deployment, edited in place. UI thread. */
final class DeploymentTable {

	private static final int ROWS = 4;

	private final FilterDocument document;
	private final TableViewer viewer;

	DeploymentTable(FilterDocument document, FormToolkit toolkit, Composite parent) {
		this.document = document;
		GridLayoutFactory.fillDefaults().numColumns(2).margins(2, 2).applyTo(parent);
		var table = toolkit.createTable(parent, SWT.FULL_SELECTION | SWT.MULTI | SWT.BORDER);
		table.setHeaderVisible(true);
		viewer = new TableViewer(table);
		viewer.setContentProvider(ArrayContentProvider.getInstance());
		GridDataFactory.fillDefaults().grab(true, true).hint(200, ROWS * table.getItemHeight()).applyTo(table);
		for (EAttribute attribute : ModelPackage.Literals.DEPLOYMENT.getEAllAttributes()) {
			column(attribute);
		}
		Composite buttons = toolkit.createComposite(parent);
		GridLayoutFactory.fillDefaults().applyTo(buttons);
		GridDataFactory.fillDefaults().applyTo(buttons);
		button(toolkit, buttons, "Add", this::add);
		button(toolkit, buttons, "Remove", this::remove);
	}

	private static void button(FormToolkit toolkit, Composite parent, String text, Runnable action) {
		Button button = toolkit.createButton(parent, text, SWT.PUSH);
		GridDataFactory.fillDefaults().applyTo(button);
		button.addListener(SWT.Selection, event -> action.run());
	}

	private void column(EAttribute attribute) {
		var column = new TableViewerColumn(viewer, SWT.NONE);
		String unit = Meta.unit(attribute);
		column.getColumn().setText(FeatureWords.label(attribute) + (unit.equals("1") ? "" : " (" + unit + ")"));
		column.getColumn().setToolTipText(Meta.documentation(attribute));
		column.getColumn().setWidth(attribute == ModelPackage.Literals.DEPLOYMENT__PROCESSOR ? 150 : 100);
		column.setLabelProvider(new ColumnLabelProvider() {
			@Override
			public String getText(Object element) {
				return text((Deployment) element, attribute);
			}
		});
		column.setEditingSupport(new EditingSupport(viewer) {
			@Override
			protected boolean canEdit(Object element) {
				return true;
			}

			@Override
			protected CellEditor getCellEditor(Object element) {
				var editor = new TextCellEditor(viewer.getTable());
				editor.setValidator(value -> problem(attribute, (String) value));
				return editor;
			}

			@Override
			protected Object getValue(Object element) {
				return text((Deployment) element, attribute);
			}

			@Override
			protected void setValue(Object element, Object value) {
				if (value != null && !value.equals(getValue(element))) {
					Object next = value.toString().isBlank() ? SetCommand.UNSET_VALUE : value.toString().strip();
					document.domain().getCommandStack()
							.execute(SetCommand.create(document.domain(), element, attribute, next));
				}
			}
		});
	}

	private static String text(Deployment deployment, EAttribute attribute) {
		return Objects.toString(deployment.eGet(attribute), "");
	}

	private String problem(EAttribute attribute, String text) {
		if (!Meta.isQuantity(attribute) || text.isBlank()) {
			return null;
		}
		try {
			new Numbers(document.parameters()).evaluate(text, attribute);
			return null;
		} catch (InputException e) {
			return e.describe();
		}
	}

	private void add() {
		Deployment deployment = ModelFactory.eINSTANCE.createDeployment();
		document.domain().getCommandStack().execute(AddCommand.create(document.domain(), document.filter(),
				ModelPackage.Literals.FILTER__DEPLOYMENTS, deployment));
		viewer.editElement(deployment, 0);
	}

	private void remove() {
		List<?> selected = viewer.getStructuredSelection().toList();
		if (!selected.isEmpty()) {
			document.domain().getCommandStack().execute(DeleteCommand.create(document.domain(), selected));
		}
	}

	void refresh() {
		Filter filter = document.filter();
		viewer.setInput(filter.getDeployments().toArray());
	}
}

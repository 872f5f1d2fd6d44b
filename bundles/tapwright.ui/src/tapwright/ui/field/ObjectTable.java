// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.field;

import java.util.List;
import java.util.Objects;

import org.eclipse.emf.common.util.Enumerator;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.emf.edit.command.AddCommand;
import org.eclipse.emf.edit.command.DeleteCommand;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.layout.TableColumnLayout;
import org.eclipse.jface.viewers.ArrayContentProvider;
import org.eclipse.jface.viewers.CellEditor;
import org.eclipse.jface.viewers.ColumnLabelProvider;
import org.eclipse.jface.viewers.ColumnWeightData;
import org.eclipse.jface.viewers.ComboBoxCellEditor;
import org.eclipse.jface.viewers.EditingSupport;
import org.eclipse.jface.viewers.TableViewer;
import org.eclipse.jface.viewers.TableViewerColumn;
import org.eclipse.jface.viewers.TextCellEditor;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.ToolBar;
import org.eclipse.swt.widgets.ToolItem;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.meta.Meta;
import tapwright.ui.look.Icons;

/** Contained objects as rows of a table, edited in place, a column for each attribute. UI thread. */
public final class ObjectTable {

	private static final int FEWEST_ROWS = 4;
	private static final int NARROWEST = 70;

	private final ModelAccess access;
	private final EReference feature;
	private final TableViewer viewer;
	private EObject owner;

	/** Makes tool bar and table in a parent of its own. */
	public ObjectTable(ModelAccess access, FormToolkit toolkit, Composite parent, EReference feature) {
		this.access = access;
		this.feature = feature;
		GridLayoutFactory.fillDefaults().margins(2, 2).spacing(0, 2).applyTo(parent);
		var tools = new ToolBar(parent, SWT.FLAT | SWT.RIGHT);
		item(tools, Icons.ADD, "Add", this::add);
		item(tools, Icons.REMOVE, "Remove", this::remove);
		Composite holder = toolkit.createComposite(parent);
		var layout = new TableColumnLayout();
		holder.setLayout(layout);
		Table table = toolkit.createTable(holder, SWT.FULL_SELECTION | SWT.MULTI | SWT.BORDER);
		table.setHeaderVisible(true);
		GridDataFactory.fillDefaults().grab(true, true).hint(200, (FEWEST_ROWS + 1) * table.getItemHeight()).applyTo(holder);
		viewer = new TableViewer(table);
		viewer.setContentProvider(ArrayContentProvider.getInstance());
		for (EAttribute attribute : feature.getEReferenceType().getEAllAttributes()) {
			column(attribute, layout);
		}
	}

	private static void item(ToolBar tools, String icon, String text, Runnable action) {
		var item = new ToolItem(tools, SWT.PUSH);
		item.setImage(Icons.get(icon));
		item.setText(text);
		item.addListener(SWT.Selection, event -> action.run());
	}

	private void column(EAttribute attribute, TableColumnLayout layout) {
		var column = new TableViewerColumn(viewer, SWT.NONE);
		String unit = Meta.unit(attribute);
		column.getColumn().setText(FeatureWords.label(attribute) + (unit.equals("1") ? "" : " (" + unit + ")"));
		column.getColumn().setToolTipText(Meta.documentation(attribute));
		layout.setColumnData(column.getColumn(), new ColumnWeightData(weight(attribute), NARROWEST));
		column.setLabelProvider(new ColumnLabelProvider() {
			@Override
			public String getText(Object element) {
				return text((EObject) element, attribute);
			}
		});
		column.setEditingSupport(attribute.getEType() instanceof EEnum choices ? new ChoiceEditing(attribute, choices)
				: new TextEditing(attribute));
	}

	private static int weight(EAttribute attribute) {
		boolean narrow = Meta.isQuantity(attribute) || attribute.getEType() instanceof EEnum;
		return narrow ? 2 : attribute.getName().equals("description") ? 5 : 3;
	}

	private static String text(EObject object, EAttribute attribute) {
		return Objects.toString(object.eGet(attribute), "");
	}

	private void set(EObject object, EAttribute attribute, Object value) {
		access.domain().getCommandStack().execute(SetCommand.create(access.domain(), object, attribute, value));
	}

	private void add() {
		EObject object = EcoreUtil.create(feature.getEReferenceType());
		access.domain().getCommandStack().execute(AddCommand.create(access.domain(), owner, feature, object));
		viewer.editElement(object, 0);
	}

	private void remove() {
		List<?> selected = viewer.getStructuredSelection().toList();
		if (!selected.isEmpty()) {
			access.domain().getCommandStack().execute(DeleteCommand.create(access.domain(), selected));
		}
	}

	/** Shows what an object contains now. */
	public void show(EObject next) {
		owner = next;
		List<?> rows = List.copyOf((List<?>) next.eGet(feature));
		if (rows.equals(viewer.getInput())) {
			viewer.refresh();
		} else {
			viewer.setInput(rows);
		}
	}

	/** Text, checked while typing. */
	private final class TextEditing extends EditingSupport {

		private final EAttribute attribute;

		TextEditing(EAttribute attribute) {
			super(viewer);
			this.attribute = attribute;
		}

		@Override
		protected boolean canEdit(Object element) {
			return true;
		}

		@Override
		protected CellEditor getCellEditor(Object element) {
			var editor = new TextCellEditor(viewer.getTable());
			editor.setValidator(value -> QuantityCheck.problem(access, attribute, (String) value).orElse(null));
			return editor;
		}

		@Override
		protected Object getValue(Object element) {
			return text((EObject) element, attribute);
		}

		@Override
		protected void setValue(Object element, Object value) {
			if (value != null && !value.equals(getValue(element))) {
				String typed = value.toString().strip();
				set((EObject) element, attribute, typed.isEmpty() ? SetCommand.UNSET_VALUE : typed);
			}
		}
	}

	/** A list of choices. */
	private final class ChoiceEditing extends EditingSupport {

		private final EAttribute attribute;
		private final EEnum choices;

		ChoiceEditing(EAttribute attribute, EEnum choices) {
			super(viewer);
			this.attribute = attribute;
			this.choices = choices;
		}

		@Override
		protected boolean canEdit(Object element) {
			return true;
		}

		@Override
		protected CellEditor getCellEditor(Object element) {
			return new ComboBoxCellEditor(viewer.getTable(),
					choices.getELiterals().stream().map(literal -> literal.getLiteral()).toArray(String[]::new), SWT.READ_ONLY);
		}

		@Override
		protected Object getValue(Object element) {
			var value = (Enumerator) ((EObject) element).eGet(attribute);
			return choices.getELiterals().indexOf(choices.getEEnumLiteralByLiteral(value.getLiteral()));
		}

		@Override
		protected void setValue(Object element, Object value) {
			int index = (Integer) value;
			if (index >= 0 && !value.equals(getValue(element))) {
				set((EObject) element, attribute, choices.getELiterals().get(index).getInstance());
			}
		}
	}
}

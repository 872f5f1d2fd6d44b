// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.viewers.CellEditor;
import org.eclipse.jface.viewers.ColumnLabelProvider;
import org.eclipse.jface.viewers.EditingSupport;
import org.eclipse.jface.viewers.ILazyContentProvider;
import org.eclipse.jface.viewers.TableViewer;
import org.eclipse.jface.viewers.TableViewerColumn;
import org.eclipse.jface.viewers.TextCellEditor;
import org.eclipse.swt.SWT;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.dnd.Transfer;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.ToolBar;
import org.eclipse.swt.widgets.ToolItem;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.InputException;
import tapwright.dsp.exact.ExactTaps;
import tapwright.dsp.exact.Rationals;
import tapwright.model.Coefficients;
import tapwright.model.IntegerCoefficients;
import tapwright.model.ModelPackage;
import tapwright.model.RealCoefficients;
import tapwright.ui.look.Icons;
import tapwright.ui.proof.Proven;

/** The coefficients as they are stored, and as they ship; edited in place, copied and pasted as text. UI thread. */
final class CoefficientTable {

	private final FilterEditor editor;
	private final TableViewer viewer;
	private final Label summary;
	private List<?> stored = List.of();
	private Optional<ExactTaps> shipped = Optional.empty();

	CoefficientTable(FilterEditor editor, FormToolkit toolkit, Composite parent) {
		this.editor = editor;
		GridLayoutFactory.fillDefaults().margins(2, 2).spacing(0, 2).applyTo(parent);
		var tools = new ToolBar(parent, SWT.FLAT | SWT.RIGHT);
		item(tools, Icons.COPY, "Copy", "Copy all numbers, one a line", this::copy);
		item(tools, Icons.PASTE, "Replace by pasted", "Replace all numbers by those on the clipboard; can be undone",
				this::paste);
		var table = toolkit.createTable(parent, SWT.VIRTUAL | SWT.FULL_SELECTION | SWT.BORDER);
		table.setHeaderVisible(true);
		GridDataFactory.fillDefaults().grab(true, true).hint(300, 5 * table.getItemHeight()).applyTo(table);
		viewer = new TableViewer(table);
		viewer.setUseHashlookup(true);
		viewer.setContentProvider((ILazyContentProvider) index -> viewer.replace(index, index));
		column("k", 50, index -> String.valueOf(index));
		column("Stored", 210, this::storedText).setEditingSupport(new Editing());
		column("Ships as", 210, this::shippedText);
		summary = toolkit.createLabel(parent, "");
		GridDataFactory.fillDefaults().grab(true, false).applyTo(summary);
	}

	private static void item(ToolBar tools, String icon, String text, String tip, Runnable action) {
		var item = new ToolItem(tools, SWT.PUSH);
		item.setImage(Icons.get(icon));
		item.setText(text);
		item.setToolTipText(tip);
		item.addListener(SWT.Selection, event -> action.run());
	}

	private TableViewerColumn column(String title, int width, IntFunction<String> text) {
		var column = new TableViewerColumn(viewer, SWT.RIGHT);
		column.getColumn().setText(title);
		column.getColumn().setWidth(width);
		column.setLabelProvider(new ColumnLabelProvider() {
			@Override
			public String getText(Object element) {
				return text.apply((Integer) element);
			}
		});
		return column;
	}

	private String storedText(int index) {
		return index < stored.size() ? String.valueOf(stored.get(index)) : "";
	}

	private String shippedText(int index) {
		return shipped.filter(taps -> index < taps.length())
				.map(taps -> String.valueOf(Rationals.nearest(taps.tap(index)))).orElse("");
	}

	/** Shows what the model and the proof have now. */
	void refresh(Optional<Proven> proven) {
		Coefficients coefficients = editor.document().root().getCoefficients();
		stored = switch (coefficients) {
		case RealCoefficients real -> List.copyOf(real.getValues());
		case IntegerCoefficients integers -> List.copyOf(integers.getIntegers());
		case null, default -> List.of();
		};
		shipped = proven.flatMap(known -> known.snapshot().subject()).map(subject -> subject.taps());
		if (viewer.getTable().getItemCount() != stored.size()) {
			viewer.setItemCount(stored.size());
		}
		viewer.refresh();
		String scale = coefficients instanceof IntegerCoefficients integers ? ", each times " + integers.getScale() : "";
		String symmetry = shipped.map(taps -> switch (taps.symmetry()) {
		case EVEN -> ", symmetric";
		case ODD -> ", antisymmetric";
		case NONE -> ", not symmetric";
		}).orElse("");
		summary.setText(stored.size() + " coefficients" + scale + symmetry);
	}

	private void copy() {
		var text = new StringBuilder();
		stored.forEach(value -> text.append(value).append('\n'));
		var clipboard = new Clipboard(viewer.getTable().getDisplay());
		try {
			if (!text.isEmpty()) {
				clipboard.setContents(new Object[] { text.toString() }, new Transfer[] { TextTransfer.getInstance() });
			}
		} finally {
			clipboard.dispose();
		}
	}

	private void paste() {
		var clipboard = new Clipboard(viewer.getTable().getDisplay());
		String text;
		try {
			text = (String) clipboard.getContents(TextTransfer.getInstance());
		} finally {
			clipboard.dispose();
		}
		try {
			Coefficients pasted = PastedNumbers.read(text == null ? "" : text);
			set(editor.document().root(), ModelPackage.Literals.FILTER__COEFFICIENTS, pasted);
		} catch (InputException e) {
			MessageDialog.openError(editor.getSite().getShell(), "Nothing was replaced", e.describe());
		}
	}

	private void set(EObject owner, EStructuralFeature feature, Object value) {
		editor.getEditingDomain().getCommandStack()
				.execute(SetCommand.create(editor.getEditingDomain(), owner, feature, value));
	}

	/** Changes one number in place. */
	private final class Editing extends EditingSupport {

		Editing() {
			super(viewer);
		}

		@Override
		protected boolean canEdit(Object element) {
			return true;
		}

		@Override
		protected CellEditor getCellEditor(Object element) {
			var cell = new TextCellEditor(viewer.getTable());
			cell.setValidator(value -> parse((String) value).isPresent() ? null : "This is not a number that can be stored here");
			return cell;
		}

		@Override
		protected Object getValue(Object element) {
			return storedText((Integer) element);
		}

		@Override
		protected void setValue(Object element, Object value) {
			if (value == null) {
				return; // the editor refused what was typed
			}
			Optional<Object> number = parse((String) value);
			int index = (Integer) element;
			if (number.isPresent() && !number.get().equals(stored.get(index))) {
				Coefficients coefficients = editor.document().root().getCoefficients();
				var feature = coefficients instanceof IntegerCoefficients ? ModelPackage.Literals.INTEGER_COEFFICIENTS__INTEGERS
						: ModelPackage.Literals.REAL_COEFFICIENTS__VALUES;
				editor.getEditingDomain().getCommandStack().execute(
						SetCommand.create(editor.getEditingDomain(), coefficients, feature, number.get(), index));
			}
		}

		private Optional<Object> parse(String text) {
			try {
				boolean integers = editor.document().root().getCoefficients() instanceof IntegerCoefficients;
				Object number = integers ? new BigInteger(text.strip()) : (Object) Double.valueOf(text.strip());
				return number instanceof Double real && !Double.isFinite(real) ? Optional.empty() : Optional.of(number);
			} catch (NumberFormatException e) {
				return Optional.empty();
			}
		}
	}
}

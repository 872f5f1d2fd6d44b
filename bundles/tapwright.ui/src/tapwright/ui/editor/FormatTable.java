// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.List;
import java.util.Objects;
import java.util.Optional;

import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.viewers.ArrayContentProvider;
import org.eclipse.jface.viewers.CellEditor;
import org.eclipse.jface.viewers.ColumnLabelProvider;
import org.eclipse.jface.viewers.ComboBoxCellEditor;
import org.eclipse.jface.viewers.EditingSupport;
import org.eclipse.jface.viewers.TableViewer;
import org.eclipse.jface.viewers.TableViewerColumn;
import org.eclipse.jface.viewers.TextCellEditor;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.InputException;
import tapwright.core.quantity.Numbers;
import tapwright.core.quantity.Words;
import tapwright.dsp.arithmetic.NumberFormat;
import tapwright.dsp.exact.Rationals;
import tapwright.model.Arithmetic;
import tapwright.model.Filter;
import tapwright.model.Format;
import tapwright.model.ModelFactory;
import tapwright.model.ModelPackage.Literals;
import tapwright.ui.field.FeatureWords;

/** One row for each place that has a number format, edited in place. UI thread. */
final class FormatTable {

	private static final List<EReference> PLACES = List.of(Literals.ARITHMETIC__COEFFICIENT, Literals.ARITHMETIC__INPUT,
			Literals.ARITHMETIC__PRODUCT, Literals.ARITHMETIC__ACCUMULATOR, Literals.ARITHMETIC__OUTPUT);
	private static final String[] SIGNS = { "signed", "unsigned" };

	private final ModelDocument<Filter> document;
	private final TableViewer viewer;
	private Arithmetic arithmetic;

	FormatTable(ModelDocument<Filter> document, FormToolkit toolkit, Composite parent) {
		this.document = document;
		var table = toolkit.createTable(parent, SWT.FULL_SELECTION | SWT.BORDER);
		table.setHeaderVisible(true);
		GridDataFactory.fillDefaults().grab(true, true).hint(400, (PLACES.size() + 1) * table.getItemHeight()).applyTo(table);
		viewer = new TableViewer(table);
		viewer.setContentProvider(ArrayContentProvider.getInstance());
		column("Where", 150, place -> FeatureWords.label(place));
		column("Word (bit)", 110, place -> text(place, Literals.FORMAT__WORD)).setEditingSupport(new Bits(Literals.FORMAT__WORD));
		column("Fraction (bit)", 110, place -> text(place, Literals.FORMAT__FRACTION))
				.setEditingSupport(new Bits(Literals.FORMAT__FRACTION));
		column("Sign", 110, place -> format(place).map(format -> SIGNS[format.isSigned() ? 0 : 1]).orElse(""))
				.setEditingSupport(new Sign());
		column("Range", 280, this::range);
		column("Step", 140, place -> numbers(place).map(format -> "2^" + -format.fraction()).orElse(""));
		viewer.setInput(PLACES);
	}

	private interface Text {
		String of(EReference place);
	}

	private TableViewerColumn column(String title, int width, Text text) {
		var column = new TableViewerColumn(viewer, SWT.LEFT);
		column.getColumn().setText(title);
		column.getColumn().setWidth(width);
		column.setLabelProvider(new ColumnLabelProvider() {
			@Override
			public String getText(Object element) {
				return text.of((EReference) element);
			}
		});
		return column;
	}

	private static String word(double value) {
		return Words.of(value, "1", 6);
	}

	private Optional<Format> format(EReference place) {
		return Optional.ofNullable(arithmetic).map(known -> (Format) known.eGet(place));
	}

	private String text(EReference place, EAttribute attribute) {
		return format(place).map(format -> Objects.toString(format.eGet(attribute), "")).orElse("");
	}

	private String range(EReference place) {
		if (format(place).isEmpty()) {
			return "exact";
		}
		return numbers(place).map(format -> word(Rationals.nearest(format.minValue())) + " to "
				+ word(Rationals.nearest(format.maxValue()))).orElse("to be completed");
	}

	private Optional<NumberFormat> numbers(EReference place) {
		return format(place).flatMap(format -> {
			var numbers = new Numbers(document.parameters());
			try {
				return Optional.of(new NumberFormat(numbers.getInt(format, Literals.FORMAT__WORD),
						numbers.getInt(format, Literals.FORMAT__FRACTION), format.isSigned()));
			} catch (InputException | IllegalArgumentException e) {
				return Optional.empty(); // the problem is told in the heading and on the first page
			}
		});
	}

	/** Shows formats; null shows none. */
	void show(Arithmetic next) {
		arithmetic = next;
		viewer.refresh();
	}

	private void execute(Command command) {
		document.domain().getCommandStack().execute(command);
	}

	/** A number of bits; without a word there is no format. */
	private final class Bits extends EditingSupport {

		private final EAttribute attribute;

		Bits(EAttribute attribute) {
			super(viewer);
			this.attribute = attribute;
		}

		@Override
		protected boolean canEdit(Object element) {
			return arithmetic != null && (attribute == Literals.FORMAT__WORD || format((EReference) element).isPresent());
		}

		@Override
		protected CellEditor getCellEditor(Object element) {
			var editor = new TextCellEditor(viewer.getTable());
			editor.setValidator(value -> problem((String) value));
			return editor;
		}

		private String problem(String text) {
			try {
				if (!text.isBlank()) {
					new Numbers(document.parameters()).evaluate(text, attribute);
				}
				return null;
			} catch (InputException e) {
				return e.describe();
			}
		}

		@Override
		protected Object getValue(Object element) {
			return text((EReference) element, attribute);
		}

		@Override
		protected void setValue(Object element, Object value) {
			if (value == null || value.equals(getValue(element))) {
				return; // refused, or nothing new
			}
			var place = (EReference) element;
			String typed = value.toString().strip();
			Optional<Format> format = format(place);
			if (format.isEmpty()) {
				Format made = ModelFactory.eINSTANCE.createFormat();
				made.setWord(typed);
				made.setFraction("0");
				execute(SetCommand.create(document.domain(), arithmetic, place, made));
			} else if (typed.isEmpty() && attribute == Literals.FORMAT__WORD) {
				execute(SetCommand.create(document.domain(), arithmetic, place, SetCommand.UNSET_VALUE));
			} else {
				Object next = typed.isEmpty() ? SetCommand.UNSET_VALUE : typed;
				execute(SetCommand.create(document.domain(), format.get(), attribute, next));
			}
		}
	}

	/** Signed or unsigned. */
	private final class Sign extends EditingSupport {

		Sign() {
			super(viewer);
		}

		@Override
		protected boolean canEdit(Object element) {
			return format((EReference) element).isPresent();
		}

		@Override
		protected CellEditor getCellEditor(Object element) {
			return new ComboBoxCellEditor(viewer.getTable(), SIGNS, SWT.READ_ONLY);
		}

		@Override
		protected Object getValue(Object element) {
			return format((EReference) element).orElseThrow().isSigned() ? 0 : 1;
		}

		@Override
		protected void setValue(Object element, Object value) {
			if (!value.equals(getValue(element))) {
				execute(SetCommand.create(document.domain(), format((EReference) element).orElseThrow(), Literals.FORMAT__SIGNED,
						value.equals(0)));
			}
		}
	}
}

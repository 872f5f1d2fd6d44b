// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.field;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Collectors;

import org.eclipse.emf.common.command.CompoundCommand;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.emf.edit.command.AddCommand;
import org.eclipse.emf.edit.command.RemoveCommand;
import org.eclipse.jface.fieldassist.ControlDecoration;
import org.eclipse.jface.fieldassist.FieldDecorationRegistry;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.eclipse.ui.forms.widgets.FormToolkit;

import tapwright.core.meta.Meta;

/**
 * A list of contained objects as rows of text, one object a row, the numbers divided by semicolons or tabs, so that rows can be
 * pasted from a spreadsheet. Replaces the list by one command when the field is left. UI thread.
 */
public final class RowsField {

	private static final int ROWS = 5;
	private static final int GAP = 4;

	private final ModelAccess access;
	private final EReference feature;
	private final List<EAttribute> columns;
	private final Text text;
	private final ControlDecoration decoration;
	private EObject object;
	private boolean filling;

	/** Makes label and text in a parent with three columns. */
	public RowsField(ModelAccess access, FormToolkit toolkit, Composite parent, EReference feature) {
		this.access = access;
		this.feature = feature;
		this.columns = feature.getEReferenceType().getEAllAttributes();
		Label label = toolkit.createLabel(parent, FeatureWords.label(feature));
		label.setToolTipText(Meta.documentation(feature));
		GridDataFactory.swtDefaults().align(SWT.BEGINNING, SWT.BEGINNING).applyTo(label);
		text = toolkit.createText(parent, "", SWT.MULTI | SWT.BORDER | SWT.V_SCROLL);
		String header = columns.stream().map(FeatureWords::label).collect(Collectors.joining("; "));
		text.setToolTipText(Meta.documentation(feature) + "\nOne row each: " + header);
		text.setData("feature", feature.getName());
		GridDataFactory.fillDefaults().grab(true, false).indent(GAP, 0).span(2, 1)
				.hint(90, ROWS * text.getLineHeight()).applyTo(text);
		toolkit.createLabel(parent, "");
		Label hint = toolkit.createLabel(parent, header);
		GridDataFactory.fillDefaults().indent(GAP, 0).span(2, 1).applyTo(hint);
		decoration = new ControlDecoration(text, SWT.TOP | SWT.LEFT);
		decoration.setImage(
				FieldDecorationRegistry.getDefault().getFieldDecoration(FieldDecorationRegistry.DEC_ERROR).getImage());
		decoration.hide();
		text.addListener(SWT.Modify, event -> check());
		text.addListener(SWT.FocusOut, event -> commit());
	}

	/** Shows the list of an object; null shows nothing. */
	public void setObject(EObject next) {
		if (next != object && object != null) {
			commit();
		}
		object = next;
		refresh();
	}

	/** Shows what the model has now, unless something is being typed. */
	public void refresh() {
		if (text.isDisposed() || text.isFocusControl() && !parse().rows().equals(rows())) {
			return;
		}
		String value = rows().stream().map(row -> String.join("; ", row).replaceFirst("(; )+$", ""))
				.collect(Collectors.joining("\n"));
		if (!text.getText().equals(value)) {
			filling = true;
			text.setText(value);
			filling = false;
		}
		check();
	}

	private List<List<String>> rows() {
		var rows = new ArrayList<List<String>>();
		if (object != null) {
			for (Object child : (List<?>) object.eGet(feature)) {
				rows.add(columns.stream().map(column -> Objects.toString(((EObject) child).eGet(column), "")).toList());
			}
		}
		return rows;
	}

	private record Parsed(List<List<String>> rows, Optional<String> problem) {
	}

	private Parsed parse() {
		var rows = new ArrayList<List<String>>();
		Optional<String> problem = Optional.empty();
		int number = 0;
		for (String line : text.getText().lines().toList()) {
			number++;
			if (line.isBlank()) {
				continue;
			}
			String[] cells = line.strip().split("\\s*[;\t]\\s*", -1);
			if (problem.isEmpty()) {
				problem = problem(number, cells);
			}
			var row = new ArrayList<String>();
			for (int k = 0; k < columns.size(); k++) {
				row.add(k < cells.length ? cells[k] : "");
			}
			rows.add(List.copyOf(row));
		}
		return new Parsed(rows, problem);
	}

	private Optional<String> problem(int number, String[] cells) {
		if (cells.length > columns.size()) {
			return Optional.of(
					"row " + number + " has " + cells.length + " numbers, but there are " + columns.size() + " columns");
		}
		for (int k = 0; k < cells.length; k++) {
			Optional<String> problem = QuantityCheck.problem(access, columns.get(k), cells[k]);
			if (problem.isPresent()) {
				return Optional.of("row " + number + ", " + FeatureWords.label(columns.get(k)) + ": " + problem.get());
			}
		}
		return Optional.empty();
	}

	private void check() {
		Optional<String> problem = parse().problem();
		problem.ifPresent(decoration::setDescriptionText);
		if (problem.isPresent()) {
			decoration.show();
		} else {
			decoration.hide();
		}
	}

	/** Brings what is being typed into the model if it makes sense. */
	public void commit() {
		Parsed parsed = parse();
		if (filling || object == null || parsed.problem().isPresent() || parsed.rows().equals(rows())) {
			return;
		}
		var command = new CompoundCommand("Change " + FeatureWords.label(feature));
		List<?> old = List.copyOf((List<?>) object.eGet(feature));
		if (!old.isEmpty()) {
			command.append(RemoveCommand.create(access.domain(), object, feature, old));
		}
		List<EObject> next = parsed.rows().stream().map(this::create).toList();
		if (!next.isEmpty()) {
			command.append(AddCommand.create(access.domain(), object, feature, next));
		}
		access.domain().getCommandStack().execute(command);
	}

	private EObject create(List<String> row) {
		EObject child = EcoreUtil.create(feature.getEReferenceType());
		for (int k = 0; k < columns.size(); k++) {
			if (!row.get(k).isBlank()) {
				child.eSet(columns.get(k), row.get(k));
			}
		}
		return child;
	}
}

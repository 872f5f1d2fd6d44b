// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.fix;

import java.util.List;
import java.util.Optional;

import org.eclipse.jface.dialogs.IDialogConstants;
import org.eclipse.jface.dialogs.TitleAreaDialog;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.swt.widgets.Text;

import tapwright.core.remedy.Remedy;

/** Lists remedies, and shows what is proven of the filter after the selected one. */
final class RemedyDialog extends TitleAreaDialog {

	private final List<Remedy> remedies;
	private org.eclipse.swt.widgets.List list;
	private Text outcome;
	private int selected;

	private RemedyDialog(Shell shell, List<Remedy> remedies) {
		super(shell);
		this.remedies = remedies;
		setShellStyle(getShellStyle() | SWT.RESIZE);
	}

	/** Lets a person choose one of at least one remedy; nothing when none is wanted. */
	static Optional<Remedy> choose(Shell shell, List<Remedy> remedies) {
		var dialog = new RemedyDialog(shell, remedies);
		return dialog.open() == OK ? Optional.of(remedies.get(dialog.selected)) : Optional.empty();
	}

	@Override
	protected void configureShell(Shell shell) {
		super.configureShell(shell);
		shell.setText("Remedies");
	}

	@Override
	protected Control createDialogArea(Composite parent) {
		setTitle("Choose a change");
		setMessage("Each was tried on a copy and proven. The change is made in the editor, where it can be undone.");
		var area = (Composite) super.createDialogArea(parent);
		var content = new Composite(area, SWT.NONE);
		content.setLayout(new GridLayout());
		GridDataFactory.fillDefaults().grab(true, true).applyTo(content);
		new Label(content, SWT.NONE).setText("&Changes:");
		list = new org.eclipse.swt.widgets.List(content, SWT.BORDER | SWT.SINGLE | SWT.V_SCROLL);
		remedies.forEach(remedy -> list.add(remedy.description()));
		GridDataFactory.fillDefaults().grab(true, false).hint(SWT.DEFAULT, 4 * list.getItemHeight()).applyTo(list);
		new Label(content, SWT.NONE).setText("&Proven after it:");
		outcome = new Text(content, SWT.BORDER | SWT.MULTI | SWT.READ_ONLY | SWT.H_SCROLL | SWT.V_SCROLL);
		GridDataFactory.fillDefaults().grab(true, true).hint(700, 160).applyTo(outcome);
		list.addListener(SWT.Selection, event -> show(list.getSelectionIndex()));
		list.select(0);
		show(0);
		return area;
	}

	private void show(int index) {
		selected = index;
		outcome.setText(remedies.get(index).preview());
	}

	@Override
	protected void createButtonsForButtonBar(Composite parent) {
		createButton(parent, OK, "Apply", true);
		createButton(parent, CANCEL, IDialogConstants.CANCEL_LABEL, false);
	}
}

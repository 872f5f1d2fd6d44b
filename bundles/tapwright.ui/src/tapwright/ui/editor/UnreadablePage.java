// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import org.eclipse.jface.dialogs.IMessageProvider;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.forms.IManagedForm;
import org.eclipse.ui.forms.editor.FormPage;
import org.eclipse.ui.forms.widgets.FormToolkit;
import org.eclipse.ui.ide.IDE;

import tapwright.model.io.ModelFileException;
import tapwright.ui.Tasks;

/** Says why a file cannot be read, and where. The file stays as it is. */
final class UnreadablePage extends FormPage {

	private static final String SYSTEM_TEXT_EDITOR = "org.eclipse.ui.systemExternalEditor";
	private static final int WIDEST = 600;

	private final ModelEditor<?> editor;
	private ModelFileException reason;
	private Label place;
	private Label words;

	UnreadablePage(ModelEditor<?> editor, ModelFileException reason) {
		super(editor, "unreadable", "Not readable");
		this.editor = editor;
		this.reason = reason;
	}

	void setReason(ModelFileException next) {
		reason = next;
		if (words != null) {
			show();
		}
	}

	@Override
	protected void createFormContent(IManagedForm form) {
		FormToolkit toolkit = form.getToolkit();
		toolkit.decorateFormHeading(form.getForm().getForm());
		form.getForm().setText("This file cannot be read");
		form.getForm().setMessage("The file is left as it is", IMessageProvider.ERROR);
		Composite body = form.getForm().getBody();
		GridLayoutFactory.swtDefaults().margins(12, 12).spacing(6, 10).applyTo(body);
		place = toolkit.createLabel(body, "");
		place.setFont(JFaceResources.getBannerFont());
		words = toolkit.createLabel(body, "", SWT.WRAP);
		GridDataFactory.fillDefaults().grab(true, false).hint(WIDEST, SWT.DEFAULT).applyTo(words);
		toolkit.createLabel(body, "Correct it with a text editor or restore it from version control, then read it again.");
		Composite buttons = toolkit.createComposite(body);
		GridLayoutFactory.fillDefaults().numColumns(2).applyTo(buttons);
		Button again = toolkit.createButton(buttons, "Read Again", SWT.PUSH);
		again.addListener(SWT.Selection, event -> editor.read());
		Button open = toolkit.createButton(buttons, "Open as Text", SWT.PUSH);
		open.addListener(SWT.Selection, event -> openAsText());
		show();
	}

	private void show() {
		place.setText(reason.line() > 0 ? reason.file() + ", line " + reason.line() + ", column " + reason.column()
				: reason.file());
		words.setText(reason.reason());
		words.getParent().layout(true, true);
	}

	private void openAsText() {
		try {
			IDE.openEditor(editor.getSite().getPage(), editor.document().file(), SYSTEM_TEXT_EDITOR);
		} catch (PartInitException e) {
			Tasks.show("No text editor could be opened", e);
		}
	}
}

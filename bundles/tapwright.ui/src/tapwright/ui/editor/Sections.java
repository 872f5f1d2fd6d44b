// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.forms.widgets.ExpandableComposite;
import org.eclipse.ui.forms.widgets.FormToolkit;
import org.eclipse.ui.forms.widgets.Section;

/** Titled areas of pages, all in one style. UI thread. */
final class Sections {

	private Sections() {
	}

	/**
	 * A titled area in a parent with a grid.
	 *
	 * @param description
	 *            a sentence below the title; may be empty
	 * @param tall
	 *            whether it takes the height that is left
	 * @return where the controls go
	 */
	static Composite create(FormToolkit toolkit, Composite parent, String title, String description, boolean tall) {
		Section section = toolkit.createSection(parent,
				ExpandableComposite.TITLE_BAR | (description.isEmpty() ? 0 : Section.DESCRIPTION));
		section.setText(title);
		if (!description.isEmpty()) {
			section.setDescription(description);
		}
		GridDataFactory.fillDefaults().grab(true, tall).applyTo(section);
		Composite client = toolkit.createComposite(section, SWT.NONE);
		GridLayoutFactory.fillDefaults().margins(2, 2).applyTo(client);
		section.setClient(client);
		return client;
	}

	/** One side of a sash, with room to the next. */
	static Composite pane(FormToolkit toolkit, Composite parent) {
		Composite pane = toolkit.createComposite(parent);
		GridLayoutFactory.fillDefaults().extendedMargins(0, 6, 0, 6).applyTo(pane);
		return pane;
	}
}

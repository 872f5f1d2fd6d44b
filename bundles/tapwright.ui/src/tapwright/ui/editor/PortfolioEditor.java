// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.List;

import org.eclipse.core.resources.IFile;
import org.eclipse.ui.IEditorInput;
import org.eclipse.ui.IEditorSite;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.forms.editor.FormPage;

import tapwright.core.quantity.Parameters;
import tapwright.model.Portfolio;

/** Edits the root file of a portfolio: its description, parameters and processors. */
public final class PortfolioEditor extends ModelEditor<Portfolio> {

	/** Id of the editor in this bundle's plugin.xml. */
	public static final String ID = "tapwright.ui.editor.portfolio";

	private PortfolioPage page;

	@Override
	public void init(IEditorSite site, IEditorInput input) throws PartInitException {
		super.init(site, input);
		setPartName(document().file().getProject().getName());
	}

	@Override
	ModelDocument<Portfolio> createDocument(IFile file) {
		return new ModelDocument<>(file, Portfolio.class, portfolio -> new Parameters(portfolio.getParameters()));
	}

	@Override
	List<? extends FormPage> createModelPages() {
		page = new PortfolioPage(this);
		return List.of(page);
	}

	@Override
	void modelChanged() {
		page.refresh();
	}

	@Override
	void commitFields() {
		page.commitFields();
	}
}

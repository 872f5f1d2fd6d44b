// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.List;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.swt.widgets.Display;
import org.eclipse.ui.IEditorInput;
import org.eclipse.ui.IEditorSite;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.forms.editor.FormPage;
import org.eclipse.ui.ide.IGotoMarker;

import tapwright.core.quantity.Expression;
import tapwright.core.verify.Partners;
import tapwright.model.Filter;
import tapwright.ui.proof.FilterSnapshot;
import tapwright.ui.proof.LiveProof;
import tapwright.workspace.EvidenceListener;
import tapwright.workspace.PortfolioProject;
import tapwright.workspace.ProblemMarkers;

/** Edits one filter file. After each command the filter is proven anew in the background. */
public final class FilterEditor extends ModelEditor<Filter> implements IGotoMarker {

	/** Id of the editor in this bundle's plugin.xml. */
	public static final String ID = "tapwright.ui.editor.filter";

	private LiveProof proof;
	private List<FilterEditorPage> pages = List.of();
	private final EvidenceListener evidenceListener = portfolio -> parametersMayHaveChanged();

	@Override
	public void init(IEditorSite site, IEditorInput input) throws PartInitException {
		super.init(site, input);
		setPartName(document().file().getFullPath().removeFileExtension().lastSegment());
		proof = new LiveProof(Display.getCurrent());
		PortfolioProject.addListener(evidenceListener);
	}

	@Override
	ModelDocument<Filter> createDocument(IFile file) {
		return new ModelDocument<>(file, Filter.class, filter -> PortfolioProject.of(file).map(PortfolioProject::parameters)
				.orElse(Expression.Names.NONE));
	}

	@Override
	List<? extends FormPage> createModelPages() {
		pages = List.of(new FilterPage(this), new RequirementsPage(this), new CoefficientsPage(this), new ArithmeticPage(this),
				new EvidencePage(this));
		return pages;
	}

	@Override
	void modelChanged() {
		prove();
		pages.forEach(FilterEditorPage::modelChanged);
	}

	@Override
	void commitFields() {
		pages.forEach(FilterEditorPage::commitFields);
	}

	// any thread: a save of the portfolio may have given a parameter another value
	private void parametersMayHaveChanged() {
		getSite().getShell().getDisplay().asyncExec(() -> {
			if (isReadable()) {
				prove();
			}
		});
	}

	private void prove() {
		Partners partners = PortfolioProject.of(document().file()).map(PortfolioProject::partners).orElse(Partners.NONE);
		proof.ask(FilterSnapshot.of(document().root(), document().parameters(), partners));
	}

	/** The evidence of the content. */
	public LiveProof proof() {
		return proof;
	}

	@Override
	public void gotoMarker(IMarker marker) {
		String requirement = marker.getAttribute(ProblemMarkers.REQUIREMENT, "");
		if (!isReadable()) {
			return;
		}
		if (requirement.isEmpty()) {
			setActivePage(FilterPage.ID);
		} else {
			showRequirement(requirement);
		}
	}

	/** Goes to a requirement where it can be changed. */
	public void showRequirement(String id) {
		if (setActivePage(RequirementsPage.ID) instanceof RequirementsPage page) {
			page.select(id);
		}
	}

	/** Goes to the evidence of a requirement. */
	public void showEvidence(String id) {
		if (setActivePage(EvidencePage.ID) instanceof EvidencePage page) {
			page.select(id);
		}
	}

	@Override
	public void dispose() {
		PortfolioProject.removeListener(evidenceListener);
		if (proof != null) {
			proof.dispose();
		}
		super.dispose();
	}
}

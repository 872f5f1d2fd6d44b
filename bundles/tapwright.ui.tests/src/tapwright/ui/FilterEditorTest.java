// SPDX-License-Identifier: EPL-2.0
package tapwright.ui;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResource;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Resource;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.eclipse.swt.widgets.ToolBar;
import org.eclipse.ui.IWorkbenchCommandConstants;
import org.eclipse.ui.forms.widgets.ImageHyperlink;
import org.eclipse.ui.ide.IDE;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;

import tapwright.dsp.verify.Verdict;
import tapwright.model.Filter;
import tapwright.model.GainRequirement;
import tapwright.model.io.ModelFiles;
import tapwright.ui.editor.FilterEditor;

@ExtendWith(NoErrorsLogged.class)
class FilterEditorTest {

	private Sample sample;

	@BeforeEach
	void makeAPortfolio() throws Exception {
		sample = new Sample();
	}

	@AfterEach
	void removeThePortfolio() throws Exception {
		sample.close();
	}

	private FilterEditor open() throws Exception {
		var editor = (FilterEditor) IDE.openEditor(Ui.page(), sample.filter);
		Ui.waitUntil("the first proof", () -> editor.proof().latest().filter(proven -> !proven.stale()).isPresent());
		return editor;
	}

	private static Control container(FilterEditor editor) {
		return editor.getActivePageInstance().getPartControl();
	}

	private static Text maxField(FilterEditor editor) {
		editor.showRequirement("ceiling");
		return Ui.field(container(editor), Text.class, "max");
	}

	private static GainRequirement ceiling(FilterEditor editor) {
		return (GainRequirement) editor.document().root().getRequirements().getFirst();
	}

	@Test
	void aRequirementThatIsTightenedAndSavedBecomesAProblemAndUndoTakesItAway() throws Exception {
		FilterEditor editor = open();
		assertEquals(Verdict.MET, editor.proof().latest().orElseThrow().evidence().verdict());
		Text max = maxField(editor);
		max.setText("-0.1");
		Ui.waitUntil("the command after the pause in typing", editor::isDirty);
		Ui.waitUntil("the new proof before saving",
				() -> editor.proof().latest().orElseThrow().evidence().verdict() == Verdict.MISSED);
		assertEquals(0, sample.problems(), "problems before saving");

		Ui.execute(IWorkbenchCommandConstants.FILE_SAVE);
		assertFalse(editor.isDirty());
		Ui.waitUntil("the problem", () -> sample.problems() == 1);

		Ui.execute(IWorkbenchCommandConstants.EDIT_UNDO);
		assertTrue(editor.isDirty(), "undone past the save point");
		assertEquals("0.1", max.getText());
		Ui.execute(IWorkbenchCommandConstants.FILE_SAVE);
		Ui.waitUntil("no problem any more", () -> sample.problems() == 0);
	}

	@Test
	void aProblemLeadsToItsRequirement() throws Exception {
		Filter filter = Sample.movingAverage();
		((GainRequirement) filter.getRequirements().getFirst()).setMax("-3");
		sample.filter.setContents(ModelFiles.toBytes(filter), true, false, null);
		Ui.waitUntil("the problem", () -> sample.problems() == 1);
		var editor = (FilterEditor) IDE.openEditor(Ui.page(), sample.problem());
		assertEquals("requirements", editor.getActivePageInstance().getId());
		assertEquals("-3", Ui.field(container(editor), Text.class, "max").getText());
		editor.setActivePage("filter");
		Ui.waitUntil("the problem among what needs attention", () -> Ui.all(container(editor), ImageHyperlink.class).stream()
				.anyMatch(link -> link.getText().startsWith("ceiling: ") && link.getSize().y > 0));
	}

	@Test
	void aRequirementIsAddedAndRemovedByCommandsThatCanBeUndone() throws Exception {
		FilterEditor editor = open();
		editor.showRequirement("ceiling");
		var tools = Ui.all(container(editor), ToolBar.class).stream()
				.filter(bar -> bar.getItemCount() == 5 && "Add".equals(bar.getItem(0).getText())).findFirst().orElseThrow();
		tools.getItem(1).notifyListeners(SWT.Selection, new Event()); // duplicate
		assertEquals(2, editor.document().root().getRequirements().size());
		assertEquals("ceiling-2", editor.document().root().getRequirements().get(1).getId());
		tools.getItem(2).notifyListeners(SWT.Selection, new Event()); // remove
		assertEquals(1, editor.document().root().getRequirements().size());
		Ui.execute(IWorkbenchCommandConstants.EDIT_UNDO);
		Ui.execute(IWorkbenchCommandConstants.EDIT_UNDO);
		assertFalse(editor.isDirty(), "undone to the saved state");
	}

	@Test
	void whatMakesNoSenseStaysInTheFieldAndIsKeptFromTheModel() throws Exception {
		FilterEditor editor = open();
		Text max = maxField(editor);
		max.setText("3 parsec");
		max.setText("3 parsecs");
		max.notifyListeners(SWT.FocusOut, new Event());
		assertEquals("0.1", ceiling(editor).getMax());
		assertFalse(editor.isDirty());
		max.setText("3 dB");
		Ui.waitUntil("the command", editor::isDirty);
		assertEquals("3 dB", ceiling(editor).getMax());
	}

	@Test
	void aFileThatCannotBeReadShowsReasonAndLineAndIsLeftAlone() throws Exception {
		byte[] broken = "<?xml version=\"1.0\"?>\n<tapwright:Filter xmlns:tapwright=\"urn:tapwright:1\"\n  sampelRate=\"8000\"/>\n"
				.getBytes(StandardCharsets.UTF_8);
		IFile file = sample.project.getFile("broken.filter");
		file.create(broken, IResource.FORCE, null);
		var editor = (FilterEditor) IDE.openEditor(Ui.page(), file);
		assertEquals("unreadable", editor.getActivePageInstance().getId());
		List<String> words = new ArrayList<>(Ui.all(container(editor), Label.class).stream().map(Label::getText).toList());
		assertTrue(words.stream().anyMatch(text -> text.contains("broken.filter, line ")), words.toString());
		assertTrue(words.stream().anyMatch(text -> text.contains("sampelRate")), words.toString());
		assertFalse(editor.isDirty());
		editor.getSite().getPage().saveEditor(editor, false);
		assertArrayEquals(broken, file.readAllBytes());

		file.setContents(ModelFiles.toBytes(Sample.movingAverage()), true, false, null);
		Ui.waitUntil("the pages once the file is mended", () -> "filter".equals(editor.getActivePageInstance().getId()));
	}

	@Test
	void aFileChangedOutsideIsReadAgain() throws Exception {
		FilterEditor editor = open();
		Filter other = Sample.movingAverage();
		((GainRequirement) other.getRequirements().getFirst()).setMax("6");
		sample.filter.setContents(ModelFiles.toBytes(other), true, false, null);
		Ui.waitUntil("the new content", () -> ceiling(editor).getMax().equals("6"));
		assertFalse(editor.isDirty());
	}

	@Test
	void savingTheSameContentKeepsTheBytes() throws Exception {
		byte[] before = sample.filter.readAllBytes();
		FilterEditor editor = open();
		Text max = maxField(editor);
		for (String value : List.of("7", "0.1")) {
			max.setText(value);
			Ui.waitUntil("the command", editor::isDirty);
			Ui.execute(IWorkbenchCommandConstants.FILE_SAVE);
		}
		assertArrayEquals(before, sample.filter.readAllBytes());
	}

	@Test
	void everyPageCanBeOpenedAndNothingIsLeftWhenEditorsAreClosed() throws Exception {
		List<Error> leaks = new ArrayList<>();
		Resource.setNonDisposeHandler(leaks::add);
		try {
			for (int round = 0; round < 5; round++) {
				FilterEditor editor = open();
				for (String page : List.of("filter", "requirements", "coefficients", "arithmetic", "evidence")) {
					editor.setActivePage(page);
					assertTrue(((Composite) container(editor)).getChildren().length > 0, page);
				}
				editor.showEvidence("ceiling");
				Ui.page().closeEditor(editor, false);
			}
			System.gc();
			while (Display.getCurrent().readAndDispatch()) {
				// the events of closing
			}
		} finally {
			Resource.setNonDisposeHandler(null);
		}
		assertEquals(List.of(), leaks, "resources that nobody disposed");
	}
}

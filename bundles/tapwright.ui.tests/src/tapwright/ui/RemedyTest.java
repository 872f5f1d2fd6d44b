// SPDX-License-Identifier: EPL-2.0
package tapwright.ui;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IResource;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.ui.IMarkerResolution;
import org.eclipse.ui.IWorkbenchCommandConstants;
import org.eclipse.ui.ide.IDE;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;

import tapwright.model.Filter;
import tapwright.model.GainRequirement;
import tapwright.model.io.ModelFiles;
import tapwright.ui.editor.FilterEditor;

@ExtendWith(NoErrorsLogged.class)
class RemedyTest {

	private static final int LOOK_AGAIN_MS = 20;

	private Sample sample;

	@BeforeEach
	void makeAPortfolio() throws Exception {
		sample = new Sample();
	}

	@AfterEach
	void removeThePortfolio() throws Exception {
		sample.close();
	}

	@Test
	void aMissedRequirementOffersAProvenChangeThatCanBeUndone() throws Exception {
		Filter missed = Sample.movingAverage();
		((GainRequirement) missed.getRequirements().getFirst()).setMax("-0.5");
		sample.filter.setContents(ModelFiles.toBytes(missed), IResource.FORCE, null);
		Ui.waitUntil("the problem", () -> sample.problems() == 1);
		IMarker marker = sample.problem();
		assertTrue(IDE.getMarkerHelpRegistry().hasResolutions(marker));
		IMarkerResolution[] resolutions = IDE.getMarkerHelpRegistry().getResolutions(marker);
		assertEquals(1, resolutions.length);
		applyTheFirstRemedy();
		resolutions[0].run(marker);
		var editor = (FilterEditor) Ui.page().getActiveEditor();
		Ui.waitUntil("the change in the editor", editor::isDirty);
		// A moving average reaches 0 dB; the miss of 0.5 dB is rounded outward to two digits.
		double limit = Double.parseDouble(ceiling(editor).getMax());
		assertTrue(limit >= 0 && limit <= 0.01, "limit " + limit);
		Ui.execute(IWorkbenchCommandConstants.EDIT_UNDO);
		assertEquals("-0.5", ceiling(editor).getMax());
	}

	private static GainRequirement ceiling(FilterEditor editor) {
		return (GainRequirement) editor.document().root().getRequirements().getFirst();
	}

	// The dialog runs an event loop of its own, in which this goes on looking for it.
	private static void applyTheFirstRemedy() {
		Display display = Display.getCurrent();
		for (Shell shell : display.getShells()) {
			if (shell.getText().equals("Remedies") && shell.isVisible()) {
				shell.getDefaultButton().notifyListeners(SWT.Selection, new Event());
				return;
			}
		}
		display.timerExec(LOOK_AGAIN_MS, RemedyTest::applyTheFirstRemedy);
	}
}

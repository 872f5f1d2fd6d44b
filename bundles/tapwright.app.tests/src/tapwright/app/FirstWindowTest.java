// SPDX-License-Identifier: EPL-2.0
package tapwright.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;

import org.eclipse.core.runtime.Platform;
import org.eclipse.ui.IPageLayout;
import org.eclipse.ui.PlatformUI;
import org.junit.jupiter.api.Test;

class FirstWindowTest {

	@Test
	void theProductOpensItsPerspectiveWithTheProblems() {
		assertEquals("tapwright.app.product", Platform.getProduct().getId());
		var page = PlatformUI.getWorkbench().getActiveWorkbenchWindow().getActivePage();
		assertEquals(TapwrightPerspective.ID, page.getPerspective().getId());
		assertNotNull(page.findView(IPageLayout.ID_PROBLEM_VIEW), "the Problems view");
	}
}

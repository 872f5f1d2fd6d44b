// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNull;

import org.eclipse.core.runtime.Platform;
import org.junit.jupiter.api.Test;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleException;

class WithoutWindowTest {

	@Test
	void theWorkspacePluginRunsWithoutAnyPluginOfTheWindow() throws BundleException {
		var workspace = Platform.getBundle("tapwright.workspace");
		workspace.start(Bundle.START_TRANSIENT);
		assertEquals(Bundle.ACTIVE, workspace.getState());
		assertNull(Platform.getBundle("org.eclipse.ui.workbench"));
		assertNull(Platform.getBundle("org.eclipse.swt"));
	}
}

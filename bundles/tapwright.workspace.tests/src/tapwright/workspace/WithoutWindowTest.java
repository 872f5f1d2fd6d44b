// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.TreeSet;

import org.eclipse.core.runtime.Platform;
import org.junit.jupiter.api.Test;
import org.osgi.framework.Bundle;
import org.osgi.framework.wiring.BundleWire;
import org.osgi.framework.wiring.BundleWiring;

class WithoutWindowTest {

	@Test
	void nothingThatTheWorkspacePluginIsWiredToBelongsToTheWindow() {
		var needed = new TreeSet<String>();
		collect(Platform.getBundle("tapwright.workspace"), needed);
		assertTrue(needed.contains("org.eclipse.core.resources"), () -> "the wires are followed: " + needed);
		var ofTheWindow = needed.stream().filter(name -> name.matches("org\\.eclipse\\.(ui|swt|jface)(\\..*)?"));
		assertEquals(List.of(), ofTheWindow.toList());
	}

	/** Adds the names of the bundle and of all that it is wired to, directly or through others. */
	private static void collect(Bundle bundle, TreeSet<String> names) {
		if (names.add(bundle.getSymbolicName())) {
			bundle.adapt(BundleWiring.class).getRequiredWires(null).stream().map(BundleWire::getProvider)
					.forEach(provider -> collect(provider.getBundle(), names));
		}
	}
}

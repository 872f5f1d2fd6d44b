// SPDX-License-Identifier: EPL-2.0
package tapwright.ui;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.core.runtime.IConfigurationElement;
import org.eclipse.core.runtime.Platform;
import org.junit.jupiter.api.Test;

/** What the plug-ins' plugin.xml files say is there. */
class ContributionsTest {

	private static final List<String> CLASS_ATTRIBUTES = List.of("class", "run", "defaultHandler", "contributorClass");

	@Test
	void everyClassThatAPluginXmlNamesCanBeLoaded() {
		var elements = new ArrayList<IConfigurationElement>();
		for (var point : Platform.getExtensionRegistry().getExtensionPoints()) {
			for (var element : point.getConfigurationElements()) {
				if (element.getContributor().getName().startsWith("tapwright.")) {
					collect(element, elements);
				}
			}
		}
		assertFalse(elements.isEmpty());
		for (var element : elements) {
			for (var attribute : CLASS_ATTRIBUTES) {
				var value = element.getAttribute(attribute);
				if (value != null) {
					// behind a colon stand parameters of the class
					var className = value.split(":", 2)[0];
					var bundle = Platform.getBundle(element.getContributor().getName());
					assertDoesNotThrow(() -> bundle.loadClass(className),
							() -> bundle.getSymbolicName() + " names " + className + " in <" + element.getName() + ">");
				}
			}
		}
	}

	private static void collect(IConfigurationElement element, List<IConfigurationElement> elements) {
		elements.add(element);
		for (var child : element.getChildren()) {
			collect(child, elements);
		}
	}
}

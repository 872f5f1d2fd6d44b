// SPDX-License-Identifier: EPL-2.0
package tapwright.core.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;

import org.junit.jupiter.api.Test;

/** The bundles use each other only downwards, and the headless ones nothing that needs a window or a workspace. */
class LayersTest {

	/** For each bundle the bundles of ours that its manifest may require. */
	private static final Map<String, Set<String>> ARROWS = Map.ofEntries(
			Map.entry("tapwright.dsp", Set.of()),
			Map.entry("tapwright.model", Set.of()),
			Map.entry("tapwright.model.edit", Set.of("tapwright.model")),
			Map.entry("tapwright.core", Set.of("tapwright.dsp", "tapwright.model")),
			Map.entry("tapwright.workspace", Set.of("tapwright.core")),
			Map.entry("tapwright.cli", Set.of("tapwright.core")),
			Map.entry("tapwright.charts", Set.of()),
			Map.entry("tapwright.ui", Set.of("tapwright.workspace", "tapwright.model.edit", "tapwright.charts")),
			Map.entry("tapwright.app", Set.of("tapwright.ui")),
			Map.entry("tapwright.testing", Set.of("tapwright.workspace")),
			Map.entry("tapwright.workspace.tests", Set.of("tapwright.core", "tapwright.workspace", "tapwright.testing")),
			Map.entry("tapwright.ui.tests", Set.of("tapwright.workspace", "tapwright.charts", "tapwright.ui", "tapwright.testing")),
			Map.entry("tapwright.app.tests", Set.of("tapwright.workspace", "tapwright.charts", "tapwright.ui", "tapwright.app", "tapwright.testing")));

	private static final List<String> HEADLESS = List.of("tapwright.dsp", "tapwright.model", "tapwright.core",
			"tapwright.cli");

	private static final Pattern NEEDS_WINDOW_OR_WORKSPACE = Pattern
			.compile("org\\.eclipse\\.(ui|swt|swtchart|jface|core\\.resources|e4|team|compare)(\\.|$)");

	private final Checkout checkout = new Checkout();

	@Test
	void everyBundleRequiresOnlyTheBundlesBelowIt() throws IOException {
		assertEquals(new TreeSet<>(ARROWS.keySet()), checkout.bundles(), "each bundle has its place in the layers");
		for (var bundle : checkout.bundles()) {
			var required = checkout.header(bundle, "Require-Bundle");
			required.removeIf(name -> !name.startsWith("tapwright."));
			required.removeAll(ARROWS.get(bundle));
			assertEquals(Set.of(), required, () -> bundle + " must not require these");
		}
	}

	@Test
	void theNumericsRequireNothingButCommonsMath() throws IOException {
		assertEquals(Set.of("org.apache.commons.math3"), checkout.header("tapwright.dsp", "Require-Bundle"));
		assertEquals(Set.of(), checkout.header("tapwright.dsp", "Import-Package"));
	}

	@Test
	void headlessBundlesRequireNeitherWindowNorWorkspace() throws IOException {
		for (var bundle : HEADLESS) {
			for (var header : List.of("Require-Bundle", "Import-Package")) {
				for (var name : checkout.header(bundle, header)) {
					assertTrue(!NEEDS_WINDOW_OR_WORKSPACE.matcher(name).lookingAt(), () -> bundle + " requires " + name);
				}
			}
		}
	}

	@Test
	void headlessSourcesUseNeitherWindowNorWorkspace() throws IOException {
		for (var bundle : HEADLESS) {
			var forbidden = bundle.equals("tapwright.dsp") ? Pattern.compile("org\\.eclipse\\.")
					: NEEDS_WINDOW_OR_WORKSPACE;
			for (var file : checkout.sources(bundle)) {
				Checkout.read(file).lines().filter(line -> line.startsWith("import "))
						.map(line -> line.replaceFirst("^import (static )?", ""))
						.filter(name -> forbidden.matcher(name).lookingAt()).findFirst()
						.ifPresent(name -> assertEquals("", name, () -> checkout.name(file) + " must not import this"));
			}
		}
	}

	@Test
	void everyExportedPackageExistsAndEveryPackageOfTheLowerBundlesIsExported() throws IOException {
		for (var bundle : checkout.bundles()) {
			var packages = packages(bundle);
			var exported = checkout.header(bundle, "Export-Package");
			if (List.of("tapwright.dsp", "tapwright.core").contains(bundle)) {
				assertEquals(packages, exported, () -> "the packages that " + bundle + " has and exports");
			} else if (!bundle.startsWith("tapwright.model")) {
				exported.removeAll(packages);
				assertEquals(Set.of(), exported, () -> bundle + " exports packages that do not exist");
			}
		}
	}

	/** The packages of a bundle that hold more than their description. */
	private Set<String> packages(String bundle) throws IOException {
		var packages = new TreeSet<String>();
		for (var file : checkout.sources(bundle)) {
			if (!file.endsWith("package-info.java")) {
				var folder = checkout.name(file.getParent());
				packages.add(folder.substring(("bundles/" + bundle + "/src/").length()).replace('/', '.'));
			}
		}
		return packages;
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.core.architecture;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;

import org.junit.jupiter.api.Test;

/** What every file of the checkout keeps to. */
class FilesTest {

	private static final String LICENCE = "// SPDX-License-Identifier: EPL-2.0\n";

	/** Hosts of package registries and folders of one machine; written so that this file does not hold them. */
	private static final Pattern TIED_TO_ONE_PLACE = Pattern.compile("repo[0-9]*\\.maven\\.ap[a]che|registry\\.npm[j]s"
			+ "|deb\\.debia[n]\\.org|download\\.eclips[e]\\.org|(?<![\\w./$}])/(work|tmp|home)/[a-z]");

	private final Checkout checkout = new Checkout();

	@Test
	void everyJavaSourceBeginsWithItsLicence() throws IOException {
		var without = new ArrayList<String>();
		for (var file : checkout.texts(".")) {
			if (file.toString().endsWith(".java") && !isGenerated(file) && !Checkout.read(file).startsWith(LICENCE)) {
				without.add(checkout.name(file));
			}
		}
		assertEquals(List.of(), without);
	}

	@Test
	void everyPackageOfOursIsDescribed() throws IOException {
		var undescribed = new ArrayList<String>();
		for (var bundle : checkout.bundles()) {
			if (bundle.endsWith(".tests")) {
				// test classes lie in the packages of what they test, which are described there
				continue;
			}
			for (var file : checkout.sources(bundle)) {
				if (!file.resolveSibling("package-info.java").toFile().exists()) {
					undescribed.add(checkout.name(file.getParent()));
				}
			}
		}
		assertEquals(List.of(), undescribed.stream().distinct().toList(), "package-info.java is missing");
	}

	@Test
	void noFileNamesARegistryHostOrAFolderOfOneMachine() throws IOException {
		var tied = new ArrayList<String>();
		for (var file : checkout.texts(".")) {
			var matcher = TIED_TO_ONE_PLACE.matcher(Checkout.read(file));
			if (matcher.find()) {
				tied.add(checkout.name(file) + ": " + matcher.group());
			}
		}
		assertEquals(List.of(), tied);
	}

	private boolean isGenerated(Path file) {
		return checkout.name(file).contains("/src-gen/");
	}
}

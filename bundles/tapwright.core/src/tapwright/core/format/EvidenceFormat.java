// SPDX-License-Identifier: EPL-2.0
package tapwright.core.format;

import java.util.List;
import java.util.Optional;

import tapwright.core.verify.VerificationRun;

/** One way to write the results of a verification. Stateless. */
public interface EvidenceFormat {

	/** What a person types to choose it. */
	String name();

	/** The results as text, deterministic, '\n' between lines. */
	String write(VerificationRun run);

	/** All formats. */
	static List<EvidenceFormat> all() {
		return List.of(new TableFormat(), new JsonFormat(), new JUnitFormat(), new SarifFormat());
	}

	/** The format of a name. */
	static Optional<EvidenceFormat> of(String name) {
		return all().stream().filter(format -> format.name().equals(name)).findFirst();
	}
}

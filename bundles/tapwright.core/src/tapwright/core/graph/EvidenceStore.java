// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.util.Optional;
import java.util.Set;

import tapwright.core.verify.FilterEvidence;

/** Keeps evidence by its hash from one session to the next. Thread-safe. */
public interface EvidenceStore {

	/** Keeps nothing. */
	EvidenceStore NONE = new EvidenceStore() {

		@Override
		public Optional<FilterEvidence> find(String hash) {
			return Optional.empty();
		}

		@Override
		public void put(FilterEvidence evidence) {
			// nothing is kept
		}

		@Override
		public void retain(Set<String> hashes) {
			// nothing is kept
		}
	};

	/** The evidence with the given hash. */
	Optional<FilterEvidence> find(String hash);

	/** Keeps evidence under its hash. */
	void put(FilterEvidence evidence);

	/** Removes all evidence with other hashes. */
	void retain(Set<String> hashes);
}

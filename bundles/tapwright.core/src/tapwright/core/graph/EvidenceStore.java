// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.io.IOException;
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

	/** The evidence with the given hash; nothing when it is not there or damaged. */
	Optional<FilterEvidence> find(String hash);

	/**
	 * Keeps evidence under its hash.
	 *
	 * @throws IOException
	 *             when it cannot be written
	 */
	void put(FilterEvidence evidence) throws IOException;

	/**
	 * Removes all evidence with other hashes.
	 *
	 * @throws IOException
	 *             when something cannot be removed
	 */
	void retain(Set<String> hashes) throws IOException;
}

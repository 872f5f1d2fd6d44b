// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.io.IOException;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.atomic.AtomicLong;
import java.util.concurrent.atomic.AtomicReference;

import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.verify.Effort;
import tapwright.dsp.verify.Verdict;

/**
 * Remembers answers by the hash of their questions, in memory and in a store that outlives the session. Thread-safe. Evidence is
 * derived: losing it costs time, nothing else.
 */
public final class EvidenceCache {

	private final EvidenceStore store;
	private final Map<String, FilterEvidence> answers = new ConcurrentHashMap<>();
	private final AtomicLong computed = new AtomicLong();
	private final AtomicReference<IOException> failure = new AtomicReference<>();

	/** A cache over a store. */
	public EvidenceCache(EvidenceStore store) {
		this.store = store;
	}

	/**
	 * The answer to a question, computed only when it is not known.
	 *
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	public FilterEvidence answer(FilterQuestion question, Effort effort) {
		FilterEvidence known = answers.get(question.hash());
		if (known == null) {
			known = store.find(question.hash()).orElse(null);
		}
		if (known == null) {
			known = question.answer(effort);
			computed.incrementAndGet();
			if (isFinal(known)) {
				keep(known);
			}
		}
		answers.put(question.hash(), known);
		return known;
	}

	/** How many questions were answered by computing since this cache was made. */
	public long computed() {
		return computed.get();
	}

	/** Forgets answers to questions that nobody asks any more. */
	void retain(Set<String> hashes) {
		answers.keySet().retainAll(hashes);
	}

	/** Removes such answers from the store, too. */
	void retainStored(Set<String> hashes) {
		try {
			store.retain(hashes);
		} catch (IOException e) {
			failure.compareAndSet(null, e);
		}
	}

	/** The first failure of the store since the last call. Evidence is then not lost, only found again at the next start. */
	public Optional<IOException> takeFailure() {
		return Optional.ofNullable(failure.getAndSet(null));
	}

	private void keep(FilterEvidence evidence) {
		try {
			store.put(evidence);
		} catch (IOException e) {
			failure.compareAndSet(null, e);
		}
	}

	// A faster machine, or more time, may prove what this one could not: so 'unproven' lasts for a session only.
	private static boolean isFinal(FilterEvidence evidence) {
		return evidence.requirements().stream()
				.noneMatch(requirement -> requirement.proof().verdict() == Verdict.UNPROVEN);
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

/**
 * A requirement that stands worse than before.
 *
 * @param filter
 *            name of the filter
 * @param requirement
 *            its id; empty when the whole filter is concerned
 * @param kind
 *            in what way
 * @param message
 *            one line for a person
 */
public record Regression(String filter, String requirement, Kind kind, String message) {

	/** In what way a requirement stands worse. */
	public enum Kind {
		/** It was met and is not met now. */
		LOST(true),
		/** It is met, but its margin shrank by more than the portfolio's threshold. */
		ERODED(true),
		/** It was met and is no longer asked: a decision of people, not a fault of the filter. */
		WITHDRAWN(false);

		private final boolean counts;

		Kind(boolean counts) {
			this.counts = counts;
		}

		/** Whether it is a regression; otherwise it is worth knowing and nothing more. */
		public boolean counts() {
			return counts;
		}
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

/**
 * One checkable statement about a filter. Implementations are immutable records whose constructors refuse meaningless
 * numbers with an {@link IllegalArgumentException} that says what to change.
 */
public interface Requirement {

	/**
	 * Proves or disproves the statement for exactly the given coefficients. Deterministic but for the time limit; may
	 * be called from several threads at once.
	 *
	 * @throws IllegalArgumentException
	 *             when the statement makes no sense for this filter (a band above half its sample rate, say)
	 * @throws java.util.concurrent.CancellationException
	 *             when the effort's progress was cancelled
	 */
	Proof prove(Subject subject, Effort effort);
}

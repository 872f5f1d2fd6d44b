// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.design;

import tapwright.dsp.Progress;

/**
 * A design method with its parameters. Implementations are immutable records; their constructors refuse meaningless parameters
 * with an {@link IllegalArgumentException} that says what to change.
 */
public interface Design {

	/**
	 * Computes the coefficients. Deterministic: the same parameters give the same bits.
	 *
	 * @throws DesignException
	 *             when there is no solution or it cannot be computed reliably; says why and what to do
	 * @throws java.util.concurrent.CancellationException
	 *             when cancelled
	 */
	DesignResult compute(Progress progress) throws DesignException;
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace;

/** Is told when the evidence of a portfolio is new. */
@FunctionalInterface
public interface EvidenceListener {

	/**
	 * Verification of a project has ended; its markers are up to date. Called on the thread that builds, never on that of the
	 * window: return soon, and pass what concerns widgets on.
	 */
	void evidenceChanged(PortfolioProject portfolio);
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.verify;

/** Combines proofs of statements that must all hold. */
final class Proofs {

	private Proofs() {
	}

	/** The proof that decides about both: a missed one before an unproven one before a met one,
			then the smaller margin. */
	static Proof worse(Proof a, Proof b) {
		int order = Integer.compare(gravity(a.verdict()), gravity(b.verdict()));
		if (order != 0) {
			return order > 0 ? a : b;
		}
		return a.margin().lo() <= b.margin().lo() ? a : b;
	}

	private static int gravity(Verdict verdict) {
		return switch (verdict) {
			case MET -> 0;
			case UNPROVEN -> 1;
			case MISSED -> 2;
		};
	}
}

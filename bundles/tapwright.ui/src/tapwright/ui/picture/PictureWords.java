// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.picture;

import java.util.List;

import tapwright.core.quantity.Words;
import tapwright.core.verify.RequirementEvidence;
import tapwright.dsp.verify.Subject;
import tapwright.dsp.verify.Verdict;
import tapwright.ui.look.Verdicts;

/** Pictures in words, for people who do not see them. */
final class PictureWords {

	private PictureWords() {
	}

	static String of(String title, List<Overlay> drawn) {
		var words = new StringBuilder(title).append('.');
		for (Overlay overlay : drawn) {
			Subject subject = overlay.snapshot().subject().orElseThrow();
			words.append(' ').append(overlay.snapshot().name()).append(": ").append(subject.taps().length())
					.append(" coefficients at ").append(Words.exactly(subject.sampleRate(), "Hz")).append('.');
			overlay.evidence().ifPresent(evidence -> {
				words.append(' ').append(Verdicts.summary(evidence)).append('.');
				evidence.requirements().stream().filter(found -> found.proof().verdict() != Verdict.MET)
						.map(RequirementEvidence::message).forEach(message -> words.append(' ').append(message).append('.'));
			});
		}
		return words.toString();
	}
}

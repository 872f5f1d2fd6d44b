// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.field;

import java.util.Locale;

import org.eclipse.emf.ecore.EStructuralFeature;

import tapwright.core.meta.Meta;

/** What a person calls a feature. */
public final class FeatureWords {

	private FeatureWords() {
	}

	/** The name as words: 'Reference at'. */
	public static String label(EStructuralFeature feature) {
		String spaced = Meta.key(feature).replaceAll("(?<=[a-z])(?=[A-Z])", " ").toLowerCase(Locale.ROOT);
		return spaced.substring(0, 1).toUpperCase(Locale.ROOT) + spaced.substring(1);
	}

	/** The literal of a choice as words: 'full scale'. */
	public static String choice(Object literal) {
		return literal.toString().replace('-', ' ');
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.util.List;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.util.EcoreUtil;

import tapwright.core.meta.Meta;
import tapwright.core.verify.RequirementKinds;
import tapwright.model.Requirement;

/** The kinds of requirement that can be added to a filter: those that can be proven. */
final class OfferedKinds {

	private OfferedKinds() {
	}

	static List<EClass> requirements() {
		return Meta.requirementKinds().stream().filter(OfferedKinds::canBeProven).toList();
	}

	private static boolean canBeProven(EClass kind) {
		try {
			RequirementKinds.of((Requirement) EcoreUtil.create(kind));
			return true;
		} catch (IllegalArgumentException e) {
			return false; // the model knows it already, its proof is still to come
		}
	}
}

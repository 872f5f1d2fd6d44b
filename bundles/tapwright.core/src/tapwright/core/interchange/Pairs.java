// SPDX-License-Identifier: EPL-2.0
package tapwright.core.interchange;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.util.EcoreUtil;

import tapwright.core.InputException;
import tapwright.model.ModelPackage;

/** Corners of limit lines are written as pairs: [[8000, -20], [12000, -80]]. */
final class Pairs {

	private Pairs() {
	}

	static boolean isPair(EReference reference) {
		return reference.getEReferenceType() == ModelPackage.Literals.LIMIT_POINT;
	}

	static EObject read(EClass type, List<?> pair, String place) throws InputException {
		List<EAttribute> features = type.getEAllAttributes();
		if (pair.size() != features.size()) {
			throw new InputException(place, "must be a pair [frequency in Hz, level in dB]");
		}
		EObject object = EcoreUtil.create(type);
		for (int k = 0; k < pair.size(); k++) {
			object.eSet(features.get(k), ObjectReader.attribute(features.get(k), pair.get(k), place + "/" + k));
		}
		return object;
	}

	static List<String> write(EObject object) {
		var texts = new ArrayList<String>();
		for (EAttribute feature : object.eClass().getEAllAttributes()) {
			texts.add((String) object.eGet(feature));
		}
		return texts;
	}
}

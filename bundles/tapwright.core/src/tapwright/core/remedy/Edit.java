// SPDX-License-Identifier: EPL-2.0
package tapwright.core.remedy;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.util.EcoreUtil;

import tapwright.model.Filter;

/**
 * A new value of one feature. An editor turns it into a command, everyone else applies it.
 *
 * @param owner
 *            object of the filter that the remedy was asked for
 * @param feature
 *            single-valued feature of the owner
 * @param value
 *            new value
 */
public record Edit(EObject owner, EStructuralFeature feature, Object value) {

	/** The same edit of an equal filter. */
	Edit on(Filter other, Filter asked) {
		EObject twin = owner == asked ? other : EcoreUtil.getEObject(other, EcoreUtil.getRelativeURIFragmentPath(asked, owner));
		return new Edit(twin, feature, value instanceof EObject content ? EcoreUtil.copy(content) : value);
	}

	/** Sets the value; on the thread that owns the filter. */
	public void apply() {
		owner.eSet(feature, value);
	}
}

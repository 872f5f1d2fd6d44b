/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model.impl;

import org.eclipse.emf.ecore.EClass;

import tapwright.model.ModelPackage;
import tapwright.model.NonNegativeAmplitudeRequirement;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Non Negative Amplitude Requirement</b></em>'.
 * <!-- end-user-doc -->
 *
 * @generated
 */
public class NonNegativeAmplitudeRequirementImpl extends RequirementImpl implements NonNegativeAmplitudeRequirement {
	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected NonNegativeAmplitudeRequirementImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return ModelPackage.Literals.NON_NEGATIVE_AMPLITUDE_REQUIREMENT;
	}

} //NonNegativeAmplitudeRequirementImpl

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Non Negative Amplitude Requirement</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * The real amplitude of symmetric coefficients is nowhere negative.
 * <!-- end-model-doc -->
 *
 *
 * @see tapwright.model.ModelPackage#getNonNegativeAmplitudeRequirement()
 * @model annotation="urn:tapwright:meta kind='non-negative-amplitude' label='Non-negative amplitude'"
 * @generated
 */
public interface NonNegativeAmplitudeRequirement extends Requirement {
} // NonNegativeAmplitudeRequirement

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Linear Phase Requirement</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * The coefficients are exactly symmetric or antisymmetric.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.LinearPhaseRequirement#getType <em>Type</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getLinearPhaseRequirement()
 * @model annotation="urn:tapwright:meta kind='linear-phase' label='Linear phase'"
 * @generated
 */
public interface LinearPhaseRequirement extends Requirement {
	/**
	 * Returns the value of the '<em><b>Type</b></em>' attribute.
	 * The literals are from the enumeration {@link tapwright.model.PhaseType}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Which of the four kinds.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Type</em>' attribute.
	 * @see tapwright.model.PhaseType
	 * @see #setType(PhaseType)
	 * @see tapwright.model.ModelPackage#getLinearPhaseRequirement_Type()
	 * @model
	 * @generated
	 */
	PhaseType getType();

	/**
	 * Sets the value of the '{@link tapwright.model.LinearPhaseRequirement#getType <em>Type</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Type</em>' attribute.
	 * @see tapwright.model.PhaseType
	 * @see #getType()
	 * @generated
	 */
	void setType(PhaseType value);

} // LinearPhaseRequirement

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Minimum Phase Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * The filter of shortest delay with the gain of another one, by spectral factorisation (Wilson, 1969).
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.MinimumPhaseDesign#getPrototype <em>Prototype</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getMinimumPhaseDesign()
 * @model annotation="urn:tapwright:meta method='minimum-phase' label='Minimum phase'"
 * @generated
 */
public interface MinimumPhaseDesign extends Design {
	/**
	 * Returns the value of the '<em><b>Prototype</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * A design with symmetric coefficients, whose squared gain is that of the result.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Prototype</em>' containment reference.
	 * @see #setPrototype(Design)
	 * @see tapwright.model.ModelPackage#getMinimumPhaseDesign_Prototype()
	 * @model containment="true"
	 * @generated
	 */
	Design getPrototype();

	/**
	 * Sets the value of the '{@link tapwright.model.MinimumPhaseDesign#getPrototype <em>Prototype</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Prototype</em>' containment reference.
	 * @see #getPrototype()
	 * @generated
	 */
	void setPrototype(Design value);

} // MinimumPhaseDesign

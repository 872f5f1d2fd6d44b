/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Complement Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * What another filter leaves over: a pure delay less that filter.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.ComplementDesign#getPrototype <em>Prototype</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getComplementDesign()
 * @model annotation="urn:tapwright:meta method='complement' label='Complement'"
 * @generated
 */
public interface ComplementDesign extends Design {
	/**
	 * Returns the value of the '<em><b>Prototype</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * A design with an odd number of symmetric coefficients.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Prototype</em>' containment reference.
	 * @see #setPrototype(Design)
	 * @see tapwright.model.ModelPackage#getComplementDesign_Prototype()
	 * @model containment="true"
	 * @generated
	 */
	Design getPrototype();

	/**
	 * Sets the value of the '{@link tapwright.model.ComplementDesign#getPrototype <em>Prototype</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Prototype</em>' containment reference.
	 * @see #getPrototype()
	 * @generated
	 */
	void setPrototype(Design value);

} // ComplementDesign

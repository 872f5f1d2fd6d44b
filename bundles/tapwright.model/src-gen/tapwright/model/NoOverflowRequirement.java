/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>No Overflow Requirement</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * No node of the structure leaves its format.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.NoOverflowRequirement#getInput <em>Input</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getNoOverflowRequirement()
 * @model annotation="urn:tapwright:meta kind='no-overflow' label='No overflow'"
 * @generated
 */
public interface NoOverflowRequirement extends Requirement {
	/**
	 * Returns the value of the '<em><b>Input</b></em>' attribute.
	 * The literals are from the enumeration {@link tapwright.model.InputClass}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The signals that it must hold for.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Input</em>' attribute.
	 * @see tapwright.model.InputClass
	 * @see #setInput(InputClass)
	 * @see tapwright.model.ModelPackage#getNoOverflowRequirement_Input()
	 * @model
	 * @generated
	 */
	InputClass getInput();

	/**
	 * Sets the value of the '{@link tapwright.model.NoOverflowRequirement#getInput <em>Input</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Input</em>' attribute.
	 * @see tapwright.model.InputClass
	 * @see #getInput()
	 * @generated
	 */
	void setInput(InputClass value);

} // NoOverflowRequirement

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Step Settling Requirement</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * After this time the step response stays within a tolerance of its final value.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.StepSettlingRequirement#getWithin <em>Within</em>}</li>
 *   <li>{@link tapwright.model.StepSettlingRequirement#getMax <em>Max</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getStepSettlingRequirement()
 * @model annotation="urn:tapwright:meta kind='step-settling' label='Step settling'"
 * @generated
 */
public interface StepSettlingRequirement extends Requirement {
	/**
	 * Returns the value of the '<em><b>Within</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Tolerance in per cent of the final value.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Within</em>' attribute.
	 * @see #setWithin(String)
	 * @see tapwright.model.ModelPackage#getStepSettlingRequirement_Within()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='%'"
	 * @generated
	 */
	String getWithin();

	/**
	 * Sets the value of the '{@link tapwright.model.StepSettlingRequirement#getWithin <em>Within</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Within</em>' attribute.
	 * @see #getWithin()
	 * @generated
	 */
	void setWithin(String value);

	/**
	 * Returns the value of the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Longest settling time in seconds.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Max</em>' attribute.
	 * @see #setMax(String)
	 * @see tapwright.model.ModelPackage#getStepSettlingRequirement_Max()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='s'"
	 * @generated
	 */
	String getMax();

	/**
	 * Sets the value of the '{@link tapwright.model.StepSettlingRequirement#getMax <em>Max</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Max</em>' attribute.
	 * @see #getMax()
	 * @generated
	 */
	void setMax(String value);

} // StepSettlingRequirement

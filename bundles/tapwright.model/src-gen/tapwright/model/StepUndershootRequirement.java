/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Step Undershoot Requirement</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * The step response goes below zero by no more than this.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.StepUndershootRequirement#getMax <em>Max</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getStepUndershootRequirement()
 * @model annotation="urn:tapwright:meta kind='step-undershoot' label='Step undershoot'"
 * @generated
 */
public interface StepUndershootRequirement extends Requirement {
	/**
	 * Returns the value of the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Largest undershoot in per cent of the final value.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Max</em>' attribute.
	 * @see #setMax(String)
	 * @see tapwright.model.ModelPackage#getStepUndershootRequirement_Max()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='%'"
	 * @generated
	 */
	String getMax();

	/**
	 * Sets the value of the '{@link tapwright.model.StepUndershootRequirement#getMax <em>Max</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Max</em>' attribute.
	 * @see #getMax()
	 * @generated
	 */
	void setMax(String value);

} // StepUndershootRequirement

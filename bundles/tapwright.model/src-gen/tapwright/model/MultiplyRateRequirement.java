/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Multiply Rate Requirement</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * The filter needs no more multiplications per second than this.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.MultiplyRateRequirement#getMax <em>Max</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getMultiplyRateRequirement()
 * @model annotation="urn:tapwright:meta kind='multiplies-per-second' label='Multiplies per second'"
 * @generated
 */
public interface MultiplyRateRequirement extends Requirement {
	/**
	 * Returns the value of the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Most multiplications per second.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Max</em>' attribute.
	 * @see #setMax(String)
	 * @see tapwright.model.ModelPackage#getMultiplyRateRequirement_Max()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getMax();

	/**
	 * Sets the value of the '{@link tapwright.model.MultiplyRateRequirement#getMax <em>Max</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Max</em>' attribute.
	 * @see #getMax()
	 * @generated
	 */
	void setMax(String value);

} // MultiplyRateRequirement

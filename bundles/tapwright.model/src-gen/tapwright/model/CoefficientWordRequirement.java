/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Coefficient Word Requirement</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * The coefficients fit a word of this length.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.CoefficientWordRequirement#getMax <em>Max</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getCoefficientWordRequirement()
 * @model annotation="urn:tapwright:meta kind='coefficient-word' label='Coefficient word length'"
 * @generated
 */
public interface CoefficientWordRequirement extends Requirement {
	/**
	 * Returns the value of the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Longest word in bits.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Max</em>' attribute.
	 * @see #setMax(String)
	 * @see tapwright.model.ModelPackage#getCoefficientWordRequirement_Max()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='bit'"
	 * @generated
	 */
	String getMax();

	/**
	 * Sets the value of the '{@link tapwright.model.CoefficientWordRequirement#getMax <em>Max</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Max</em>' attribute.
	 * @see #getMax()
	 * @generated
	 */
	void setMax(String value);

} // CoefficientWordRequirement

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Power Complementary Requirement</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * The squared gains of this filter and a partner add up to one.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.PowerComplementaryRequirement#getPartner <em>Partner</em>}</li>
 *   <li>{@link tapwright.model.PowerComplementaryRequirement#getMax <em>Max</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getPowerComplementaryRequirement()
 * @model annotation="urn:tapwright:meta kind='power-complementary' label='Power complementary'"
 * @generated
 */
public interface PowerComplementaryRequirement extends Requirement {
	/**
	 * Returns the value of the '<em><b>Partner</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Name of the partner filter.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Partner</em>' attribute.
	 * @see #setPartner(String)
	 * @see tapwright.model.ModelPackage#getPowerComplementaryRequirement_Partner()
	 * @model
	 * @generated
	 */
	String getPartner();

	/**
	 * Sets the value of the '{@link tapwright.model.PowerComplementaryRequirement#getPartner <em>Partner</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Partner</em>' attribute.
	 * @see #getPartner()
	 * @generated
	 */
	void setPartner(String value);

	/**
	 * Returns the value of the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Largest deviation of the sum from 0 dB.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Max</em>' attribute.
	 * @see #setMax(String)
	 * @see tapwright.model.ModelPackage#getPowerComplementaryRequirement_Max()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='dB'"
	 * @generated
	 */
	String getMax();

	/**
	 * Sets the value of the '{@link tapwright.model.PowerComplementaryRequirement#getMax <em>Max</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Max</em>' attribute.
	 * @see #getMax()
	 * @generated
	 */
	void setMax(String value);

} // PowerComplementaryRequirement

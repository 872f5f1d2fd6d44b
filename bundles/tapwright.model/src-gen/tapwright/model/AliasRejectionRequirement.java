/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Alias Rejection Requirement</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * What folds into the kept band when one sample in so many is kept is this far below the gain limit of 0 dB.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.AliasRejectionRequirement#getFactor <em>Factor</em>}</li>
 *   <li>{@link tapwright.model.AliasRejectionRequirement#getTo <em>To</em>}</li>
 *   <li>{@link tapwright.model.AliasRejectionRequirement#getMin <em>Min</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getAliasRejectionRequirement()
 * @model annotation="urn:tapwright:meta kind='alias-rejection' label='Alias rejection'"
 * @generated
 */
public interface AliasRejectionRequirement extends Requirement {
	/**
	 * Returns the value of the '<em><b>Factor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * How many samples become one.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Factor</em>' attribute.
	 * @see #setFactor(String)
	 * @see tapwright.model.ModelPackage#getAliasRejectionRequirement_Factor()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getFactor();

	/**
	 * Sets the value of the '{@link tapwright.model.AliasRejectionRequirement#getFactor <em>Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Factor</em>' attribute.
	 * @see #getFactor()
	 * @generated
	 */
	void setFactor(String value);

	/**
	 * Returns the value of the '<em><b>To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Upper edge of the kept band in Hz.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>To</em>' attribute.
	 * @see #setTo(String)
	 * @see tapwright.model.ModelPackage#getAliasRejectionRequirement_To()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getTo();

	/**
	 * Sets the value of the '{@link tapwright.model.AliasRejectionRequirement#getTo <em>To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>To</em>' attribute.
	 * @see #getTo()
	 * @generated
	 */
	void setTo(String value);

	/**
	 * Returns the value of the '<em><b>Min</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Smallest rejection in dB, positive.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Min</em>' attribute.
	 * @see #setMin(String)
	 * @see tapwright.model.ModelPackage#getAliasRejectionRequirement_Min()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='dB'"
	 * @generated
	 */
	String getMin();

	/**
	 * Sets the value of the '{@link tapwright.model.AliasRejectionRequirement#getMin <em>Min</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Min</em>' attribute.
	 * @see #getMin()
	 * @generated
	 */
	void setMin(String value);

} // AliasRejectionRequirement

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Impulse Tail Requirement</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * After this time the impulse response stays below a part of its largest value.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.ImpulseTailRequirement#getAfter <em>After</em>}</li>
 *   <li>{@link tapwright.model.ImpulseTailRequirement#getMax <em>Max</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getImpulseTailRequirement()
 * @model annotation="urn:tapwright:meta kind='impulse-tail' label='Impulse tail'"
 * @generated
 */
public interface ImpulseTailRequirement extends Requirement {
	/**
	 * Returns the value of the '<em><b>After</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Start of the tail in seconds.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>After</em>' attribute.
	 * @see #setAfter(String)
	 * @see tapwright.model.ModelPackage#getImpulseTailRequirement_After()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='s'"
	 * @generated
	 */
	String getAfter();

	/**
	 * Sets the value of the '{@link tapwright.model.ImpulseTailRequirement#getAfter <em>After</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>After</em>' attribute.
	 * @see #getAfter()
	 * @generated
	 */
	void setAfter(String value);

	/**
	 * Returns the value of the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Largest magnitude in the tail in per cent of the largest magnitude of all.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Max</em>' attribute.
	 * @see #setMax(String)
	 * @see tapwright.model.ModelPackage#getImpulseTailRequirement_Max()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='%'"
	 * @generated
	 */
	String getMax();

	/**
	 * Sets the value of the '{@link tapwright.model.ImpulseTailRequirement#getMax <em>Max</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Max</em>' attribute.
	 * @see #getMax()
	 * @generated
	 */
	void setMax(String value);

} // ImpulseTailRequirement

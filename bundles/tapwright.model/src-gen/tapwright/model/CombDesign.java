/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Comb Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * The sum or difference of two samples, a period apart.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.CombDesign#getPeriod <em>Period</em>}</li>
 *   <li>{@link tapwright.model.CombDesign#isDifference <em>Difference</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getCombDesign()
 * @model annotation="urn:tapwright:meta method='comb' label='Comb'"
 * @generated
 */
public interface CombDesign extends Design {
	/**
	 * Returns the value of the '<em><b>Period</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Distance of the samples in seconds.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Period</em>' attribute.
	 * @see #setPeriod(String)
	 * @see tapwright.model.ModelPackage#getCombDesign_Period()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='s'"
	 * @generated
	 */
	String getPeriod();

	/**
	 * Sets the value of the '{@link tapwright.model.CombDesign#getPeriod <em>Period</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Period</em>' attribute.
	 * @see #getPeriod()
	 * @generated
	 */
	void setPeriod(String value);

	/**
	 * Returns the value of the '<em><b>Difference</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * 0 Hz is a zero.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Difference</em>' attribute.
	 * @see #setDifference(boolean)
	 * @see tapwright.model.ModelPackage#getCombDesign_Difference()
	 * @model
	 * @generated
	 */
	boolean isDifference();

	/**
	 * Sets the value of the '{@link tapwright.model.CombDesign#isDifference <em>Difference</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Difference</em>' attribute.
	 * @see #isDifference()
	 * @generated
	 */
	void setDifference(boolean value);

} // CombDesign

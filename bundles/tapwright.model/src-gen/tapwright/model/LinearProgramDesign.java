/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Linear Program Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Smallest largest error within all gain limits, step limits, nulls and exact gains that the requirements ask for.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.LinearProgramDesign#isMonotone <em>Monotone</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getLinearProgramDesign()
 * @model annotation="urn:tapwright:meta method='linear-program' label='Linear program'"
 * @generated
 */
public interface LinearProgramDesign extends BandDesign {
	/**
	 * Returns the value of the '<em><b>Monotone</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The amplitude only falls in the first band.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Monotone</em>' attribute.
	 * @see #setMonotone(boolean)
	 * @see tapwright.model.ModelPackage#getLinearProgramDesign_Monotone()
	 * @model
	 * @generated
	 */
	boolean isMonotone();

	/**
	 * Sets the value of the '{@link tapwright.model.LinearProgramDesign#isMonotone <em>Monotone</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Monotone</em>' attribute.
	 * @see #isMonotone()
	 * @generated
	 */
	void setMonotone(boolean value);

} // LinearProgramDesign

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Maximally Flat Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * As flat as possible at 0 Hz and at half the sample rate (Herrmann, 1971); equal orders give a half-band filter.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.MaximallyFlatDesign#getFlatness <em>Flatness</em>}</li>
 *   <li>{@link tapwright.model.MaximallyFlatDesign#getZeros <em>Zeros</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getMaximallyFlatDesign()
 * @model annotation="urn:tapwright:meta method='maximally-flat' label='Maximally flat'"
 * @generated
 */
public interface MaximallyFlatDesign extends Design {
	/**
	 * Returns the value of the '<em><b>Flatness</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Order of contact at 0 Hz.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Flatness</em>' attribute.
	 * @see #setFlatness(String)
	 * @see tapwright.model.ModelPackage#getMaximallyFlatDesign_Flatness()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getFlatness();

	/**
	 * Sets the value of the '{@link tapwright.model.MaximallyFlatDesign#getFlatness <em>Flatness</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Flatness</em>' attribute.
	 * @see #getFlatness()
	 * @generated
	 */
	void setFlatness(String value);

	/**
	 * Returns the value of the '<em><b>Zeros</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Order of the zero at half the sample rate.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Zeros</em>' attribute.
	 * @see #setZeros(String)
	 * @see tapwright.model.ModelPackage#getMaximallyFlatDesign_Zeros()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getZeros();

	/**
	 * Sets the value of the '{@link tapwright.model.MaximallyFlatDesign#getZeros <em>Zeros</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Zeros</em>' attribute.
	 * @see #getZeros()
	 * @generated
	 */
	void setZeros(String value);

} // MaximallyFlatDesign

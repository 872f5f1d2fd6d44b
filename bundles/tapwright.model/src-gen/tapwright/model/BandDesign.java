/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Band Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A method that approximates a target over bands. Without bands of its own it takes them from the gain requirements.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.BandDesign#getTaps <em>Taps</em>}</li>
 *   <li>{@link tapwright.model.BandDesign#getBands <em>Bands</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getBandDesign()
 * @model abstract="true"
 * @generated
 */
public interface BandDesign extends Design {
	/**
	 * Returns the value of the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Number of coefficients.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Taps</em>' attribute.
	 * @see #setTaps(String)
	 * @see tapwright.model.ModelPackage#getBandDesign_Taps()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getTaps();

	/**
	 * Sets the value of the '{@link tapwright.model.BandDesign#getTaps <em>Taps</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Taps</em>' attribute.
	 * @see #getTaps()
	 * @generated
	 */
	void setTaps(String value);

	/**
	 * Returns the value of the '<em><b>Bands</b></em>' containment reference list.
	 * The list contents are of type {@link tapwright.model.DesignBand}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Target, by rising frequency.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Bands</em>' containment reference list.
	 * @see tapwright.model.ModelPackage#getBandDesign_Bands()
	 * @model containment="true"
	 * @generated
	 */
	EList<DesignBand> getBands();

} // BandDesign

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Half Band Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Equiripple half-band filter with exact zeros (Vaidyanathan and Nguyen, 1987), or its Hilbert transformer.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.HalfBandDesign#getTaps <em>Taps</em>}</li>
 *   <li>{@link tapwright.model.HalfBandDesign#getPassEdge <em>Pass Edge</em>}</li>
 *   <li>{@link tapwright.model.HalfBandDesign#isHilbert <em>Hilbert</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getHalfBandDesign()
 * @model annotation="urn:tapwright:meta method='half-band' label='Half-band'"
 * @generated
 */
public interface HalfBandDesign extends Design {
	/**
	 * Returns the value of the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Number of coefficients, 4 J - 1.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Taps</em>' attribute.
	 * @see #setTaps(String)
	 * @see tapwright.model.ModelPackage#getHalfBandDesign_Taps()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getTaps();

	/**
	 * Sets the value of the '{@link tapwright.model.HalfBandDesign#getTaps <em>Taps</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Taps</em>' attribute.
	 * @see #getTaps()
	 * @generated
	 */
	void setTaps(String value);

	/**
	 * Returns the value of the '<em><b>Pass Edge</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Upper edge of the pass band in Hz, below a quarter of the sample rate.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Pass Edge</em>' attribute.
	 * @see #setPassEdge(String)
	 * @see tapwright.model.ModelPackage#getHalfBandDesign_PassEdge()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getPassEdge();

	/**
	 * Sets the value of the '{@link tapwright.model.HalfBandDesign#getPassEdge <em>Pass Edge</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Pass Edge</em>' attribute.
	 * @see #getPassEdge()
	 * @generated
	 */
	void setPassEdge(String value);

	/**
	 * Returns the value of the '<em><b>Hilbert</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The Hilbert transformer instead.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Hilbert</em>' attribute.
	 * @see #setHilbert(boolean)
	 * @see tapwright.model.ModelPackage#getHalfBandDesign_Hilbert()
	 * @model
	 * @generated
	 */
	boolean isHilbert();

	/**
	 * Sets the value of the '{@link tapwright.model.HalfBandDesign#isHilbert <em>Hilbert</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Hilbert</em>' attribute.
	 * @see #isHilbert()
	 * @generated
	 */
	void setHilbert(boolean value);

} // HalfBandDesign

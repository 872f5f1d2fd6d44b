/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Moving Average Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * The mean of the last samples, once or several times one after the other.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.MovingAverageDesign#getTaps <em>Taps</em>}</li>
 *   <li>{@link tapwright.model.MovingAverageDesign#getSections <em>Sections</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getMovingAverageDesign()
 * @model annotation="urn:tapwright:meta method='moving-average' label='Moving average'"
 * @generated
 */
public interface MovingAverageDesign extends Design {
	/**
	 * Returns the value of the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Samples of one mean.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Taps</em>' attribute.
	 * @see #setTaps(String)
	 * @see tapwright.model.ModelPackage#getMovingAverageDesign_Taps()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getTaps();

	/**
	 * Sets the value of the '{@link tapwright.model.MovingAverageDesign#getTaps <em>Taps</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Taps</em>' attribute.
	 * @see #getTaps()
	 * @generated
	 */
	void setTaps(String value);

	/**
	 * Returns the value of the '<em><b>Sections</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * How many means follow each other; 1 when empty.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Sections</em>' attribute.
	 * @see #setSections(String)
	 * @see tapwright.model.ModelPackage#getMovingAverageDesign_Sections()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getSections();

	/**
	 * Sets the value of the '{@link tapwright.model.MovingAverageDesign#getSections <em>Sections</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Sections</em>' attribute.
	 * @see #getSections()
	 * @generated
	 */
	void setSections(String value);

} // MovingAverageDesign

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Window Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * The ideal response cut by a window.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.WindowDesign#getWindow <em>Window</em>}</li>
 *   <li>{@link tapwright.model.WindowDesign#getParameter <em>Parameter</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getWindowDesign()
 * @model annotation="urn:tapwright:meta method='window' label='Window'"
 * @generated
 */
public interface WindowDesign extends BandDesign {
	/**
	 * Returns the value of the '<em><b>Window</b></em>' attribute.
	 * The default value is <code>"kaiser"</code>.
	 * The literals are from the enumeration {@link tapwright.model.WindowKind}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Which window.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Window</em>' attribute.
	 * @see tapwright.model.WindowKind
	 * @see #setWindow(WindowKind)
	 * @see tapwright.model.ModelPackage#getWindowDesign_Window()
	 * @model default="kaiser"
	 * @generated
	 */
	WindowKind getWindow();

	/**
	 * Sets the value of the '{@link tapwright.model.WindowDesign#getWindow <em>Window</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Window</em>' attribute.
	 * @see tapwright.model.WindowKind
	 * @see #getWindow()
	 * @generated
	 */
	void setWindow(WindowKind value);

	/**
	 * Returns the value of the '<em><b>Parameter</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Shape parameter of windows that have one; for the Kaiser window beta, taken from the requirements when empty.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Parameter</em>' attribute.
	 * @see #setParameter(String)
	 * @see tapwright.model.ModelPackage#getWindowDesign_Parameter()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getParameter();

	/**
	 * Sets the value of the '{@link tapwright.model.WindowDesign#getParameter <em>Parameter</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Parameter</em>' attribute.
	 * @see #getParameter()
	 * @generated
	 */
	void setParameter(String value);

} // WindowDesign

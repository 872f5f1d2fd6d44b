/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Cic Compensator Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Makes the pass band of a cascaded integrator-comb decimator in front of it flat.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.CicCompensatorDesign#getTaps <em>Taps</em>}</li>
 *   <li>{@link tapwright.model.CicCompensatorDesign#getSections <em>Sections</em>}</li>
 *   <li>{@link tapwright.model.CicCompensatorDesign#getRate <em>Rate</em>}</li>
 *   <li>{@link tapwright.model.CicCompensatorDesign#getPassEdge <em>Pass Edge</em>}</li>
 *   <li>{@link tapwright.model.CicCompensatorDesign#getStopEdge <em>Stop Edge</em>}</li>
 *   <li>{@link tapwright.model.CicCompensatorDesign#getStopWeight <em>Stop Weight</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getCicCompensatorDesign()
 * @model annotation="urn:tapwright:meta method='cic-compensator' label='Droop compensator'"
 * @generated
 */
public interface CicCompensatorDesign extends Design {
	/**
	 * Returns the value of the '<em><b>Taps</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Number of coefficients.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Taps</em>' attribute.
	 * @see #setTaps(String)
	 * @see tapwright.model.ModelPackage#getCicCompensatorDesign_Taps()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getTaps();

	/**
	 * Sets the value of the '{@link tapwright.model.CicCompensatorDesign#getTaps <em>Taps</em>}' attribute.
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
	 * Sections of the decimator.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Sections</em>' attribute.
	 * @see #setSections(String)
	 * @see tapwright.model.ModelPackage#getCicCompensatorDesign_Sections()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getSections();

	/**
	 * Sets the value of the '{@link tapwright.model.CicCompensatorDesign#getSections <em>Sections</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Sections</em>' attribute.
	 * @see #getSections()
	 * @generated
	 */
	void setSections(String value);

	/**
	 * Returns the value of the '<em><b>Rate</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Factor of the decimator.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Rate</em>' attribute.
	 * @see #setRate(String)
	 * @see tapwright.model.ModelPackage#getCicCompensatorDesign_Rate()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getRate();

	/**
	 * Sets the value of the '{@link tapwright.model.CicCompensatorDesign#getRate <em>Rate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Rate</em>' attribute.
	 * @see #getRate()
	 * @generated
	 */
	void setRate(String value);

	/**
	 * Returns the value of the '<em><b>Pass Edge</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Upper edge of the flat band in Hz.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Pass Edge</em>' attribute.
	 * @see #setPassEdge(String)
	 * @see tapwright.model.ModelPackage#getCicCompensatorDesign_PassEdge()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getPassEdge();

	/**
	 * Sets the value of the '{@link tapwright.model.CicCompensatorDesign#getPassEdge <em>Pass Edge</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Pass Edge</em>' attribute.
	 * @see #getPassEdge()
	 * @generated
	 */
	void setPassEdge(String value);

	/**
	 * Returns the value of the '<em><b>Stop Edge</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Lower edge of the stop band in Hz.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Stop Edge</em>' attribute.
	 * @see #setStopEdge(String)
	 * @see tapwright.model.ModelPackage#getCicCompensatorDesign_StopEdge()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getStopEdge();

	/**
	 * Sets the value of the '{@link tapwright.model.CicCompensatorDesign#getStopEdge <em>Stop Edge</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Stop Edge</em>' attribute.
	 * @see #getStopEdge()
	 * @generated
	 */
	void setStopEdge(String value);

	/**
	 * Returns the value of the '<em><b>Stop Weight</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Weight of the error in the stop band; 1 when empty.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Stop Weight</em>' attribute.
	 * @see #setStopWeight(String)
	 * @see tapwright.model.ModelPackage#getCicCompensatorDesign_StopWeight()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getStopWeight();

	/**
	 * Sets the value of the '{@link tapwright.model.CicCompensatorDesign#getStopWeight <em>Stop Weight</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Stop Weight</em>' attribute.
	 * @see #getStopWeight()
	 * @generated
	 */
	void setStopWeight(String value);

} // CicCompensatorDesign

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Deployment</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A filter on a processor.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.Deployment#getProcessor <em>Processor</em>}</li>
 *   <li>{@link tapwright.model.Deployment#getChannels <em>Channels</em>}</li>
 *   <li>{@link tapwright.model.Deployment#getCopies <em>Copies</em>}</li>
 *   <li>{@link tapwright.model.Deployment#getInputRate <em>Input Rate</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getDeployment()
 * @model
 * @generated
 */
public interface Deployment extends EObject {
	/**
	 * Returns the value of the '<em><b>Processor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Name of the processor.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Processor</em>' attribute.
	 * @see #setProcessor(String)
	 * @see tapwright.model.ModelPackage#getDeployment_Processor()
	 * @model
	 * @generated
	 */
	String getProcessor();

	/**
	 * Sets the value of the '{@link tapwright.model.Deployment#getProcessor <em>Processor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Processor</em>' attribute.
	 * @see #getProcessor()
	 * @generated
	 */
	void setProcessor(String value);

	/**
	 * Returns the value of the '<em><b>Channels</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Independent channels.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Channels</em>' attribute.
	 * @see #setChannels(String)
	 * @see tapwright.model.ModelPackage#getDeployment_Channels()
	 * @model default="1" dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getChannels();

	/**
	 * Sets the value of the '{@link tapwright.model.Deployment#getChannels <em>Channels</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Channels</em>' attribute.
	 * @see #getChannels()
	 * @generated
	 */
	void setChannels(String value);

	/**
	 * Returns the value of the '<em><b>Copies</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Instances of the filter per channel.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Copies</em>' attribute.
	 * @see #setCopies(String)
	 * @see tapwright.model.ModelPackage#getDeployment_Copies()
	 * @model default="1" dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getCopies();

	/**
	 * Sets the value of the '{@link tapwright.model.Deployment#getCopies <em>Copies</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Copies</em>' attribute.
	 * @see #getCopies()
	 * @generated
	 */
	void setCopies(String value);

	/**
	 * Returns the value of the '<em><b>Input Rate</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Sample rate at the input in Hz; the filter's own when empty.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Input Rate</em>' attribute.
	 * @see #setInputRate(String)
	 * @see tapwright.model.ModelPackage#getDeployment_InputRate()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getInputRate();

	/**
	 * Sets the value of the '{@link tapwright.model.Deployment#getInputRate <em>Input Rate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Input Rate</em>' attribute.
	 * @see #getInputRate()
	 * @generated
	 */
	void setInputRate(String value);

} // Deployment

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Lagrange Delay Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A delay by any number of samples, maximally flat at 0 Hz.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.LagrangeDelayDesign#getOrder <em>Order</em>}</li>
 *   <li>{@link tapwright.model.LagrangeDelayDesign#getDelay <em>Delay</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getLagrangeDelayDesign()
 * @model annotation="urn:tapwright:meta method='lagrange-delay' label='Lagrange fractional delay'"
 * @generated
 */
public interface LagrangeDelayDesign extends Design {
	/**
	 * Returns the value of the '<em><b>Order</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Number of coefficients less one.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Order</em>' attribute.
	 * @see #setOrder(String)
	 * @see tapwright.model.ModelPackage#getLagrangeDelayDesign_Order()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getOrder();

	/**
	 * Sets the value of the '{@link tapwright.model.LagrangeDelayDesign#getOrder <em>Order</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Order</em>' attribute.
	 * @see #getOrder()
	 * @generated
	 */
	void setOrder(String value);

	/**
	 * Returns the value of the '<em><b>Delay</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Delay in seconds.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Delay</em>' attribute.
	 * @see #setDelay(String)
	 * @see tapwright.model.ModelPackage#getLagrangeDelayDesign_Delay()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='s'"
	 * @generated
	 */
	String getDelay();

	/**
	 * Sets the value of the '{@link tapwright.model.LagrangeDelayDesign#getDelay <em>Delay</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Delay</em>' attribute.
	 * @see #getDelay()
	 * @generated
	 */
	void setDelay(String value);

} // LagrangeDelayDesign

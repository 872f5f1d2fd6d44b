/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Design Band</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A straight line of desired amplitude over a band.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.DesignBand#getFrom <em>From</em>}</li>
 *   <li>{@link tapwright.model.DesignBand#getTo <em>To</em>}</li>
 *   <li>{@link tapwright.model.DesignBand#getDesired <em>Desired</em>}</li>
 *   <li>{@link tapwright.model.DesignBand#getDesiredTo <em>Desired To</em>}</li>
 *   <li>{@link tapwright.model.DesignBand#getWeight <em>Weight</em>}</li>
 *   <li>{@link tapwright.model.DesignBand#getWeightTo <em>Weight To</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getDesignBand()
 * @model
 * @generated
 */
public interface DesignBand extends EObject {
	/**
	 * Returns the value of the '<em><b>From</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Lower band edge in Hz.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>From</em>' attribute.
	 * @see #setFrom(String)
	 * @see tapwright.model.ModelPackage#getDesignBand_From()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getFrom();

	/**
	 * Sets the value of the '{@link tapwright.model.DesignBand#getFrom <em>From</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>From</em>' attribute.
	 * @see #getFrom()
	 * @generated
	 */
	void setFrom(String value);

	/**
	 * Returns the value of the '<em><b>To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Upper band edge in Hz.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>To</em>' attribute.
	 * @see #setTo(String)
	 * @see tapwright.model.ModelPackage#getDesignBand_To()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getTo();

	/**
	 * Sets the value of the '{@link tapwright.model.DesignBand#getTo <em>To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>To</em>' attribute.
	 * @see #getTo()
	 * @generated
	 */
	void setTo(String value);

	/**
	 * Returns the value of the '<em><b>Desired</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Desired amplitude at the lower edge, a plain number.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Desired</em>' attribute.
	 * @see #setDesired(String)
	 * @see tapwright.model.ModelPackage#getDesignBand_Desired()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getDesired();

	/**
	 * Sets the value of the '{@link tapwright.model.DesignBand#getDesired <em>Desired</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Desired</em>' attribute.
	 * @see #getDesired()
	 * @generated
	 */
	void setDesired(String value);

	/**
	 * Returns the value of the '<em><b>Desired To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Desired amplitude at the upper edge; the same as at the lower when empty.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Desired To</em>' attribute.
	 * @see #setDesiredTo(String)
	 * @see tapwright.model.ModelPackage#getDesignBand_DesiredTo()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getDesiredTo();

	/**
	 * Sets the value of the '{@link tapwright.model.DesignBand#getDesiredTo <em>Desired To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Desired To</em>' attribute.
	 * @see #getDesiredTo()
	 * @generated
	 */
	void setDesiredTo(String value);

	/**
	 * Returns the value of the '<em><b>Weight</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Weight of the error at the lower edge; 1 when empty.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Weight</em>' attribute.
	 * @see #setWeight(String)
	 * @see tapwright.model.ModelPackage#getDesignBand_Weight()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getWeight();

	/**
	 * Sets the value of the '{@link tapwright.model.DesignBand#getWeight <em>Weight</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Weight</em>' attribute.
	 * @see #getWeight()
	 * @generated
	 */
	void setWeight(String value);

	/**
	 * Returns the value of the '<em><b>Weight To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Weight of the error at the upper edge; the same as at the lower when empty.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Weight To</em>' attribute.
	 * @see #setWeightTo(String)
	 * @see tapwright.model.ModelPackage#getDesignBand_WeightTo()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getWeightTo();

	/**
	 * Sets the value of the '{@link tapwright.model.DesignBand#getWeightTo <em>Weight To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Weight To</em>' attribute.
	 * @see #getWeightTo()
	 * @generated
	 */
	void setWeightTo(String value);

} // DesignBand

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import java.math.BigInteger;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Integer Coefficients</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Coefficients as integers times a scale.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.IntegerCoefficients#getIntegers <em>Integers</em>}</li>
 *   <li>{@link tapwright.model.IntegerCoefficients#getScale <em>Scale</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getIntegerCoefficients()
 * @model annotation="urn:tapwright:meta json='integers'"
 * @generated
 */
public interface IntegerCoefficients extends Coefficients {
	/**
	 * Returns the value of the '<em><b>Integers</b></em>' attribute list.
	 * The list contents are of type {@link java.math.BigInteger}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * h[0..N-1] divided by the scale.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Integers</em>' attribute list.
	 * @see tapwright.model.ModelPackage#getIntegerCoefficients_Integers()
	 * @model unique="false"
	 * @generated
	 */
	EList<BigInteger> getIntegers();

	/**
	 * Returns the value of the '<em><b>Scale</b></em>' attribute.
	 * The default value is <code>"1"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What one step is worth: a power of two such as '2^-15', a fraction such as '1/35', or a decimal.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Scale</em>' attribute.
	 * @see #setScale(String)
	 * @see tapwright.model.ModelPackage#getIntegerCoefficients_Scale()
	 * @model default="1"
	 * @generated
	 */
	String getScale();

	/**
	 * Sets the value of the '{@link tapwright.model.IntegerCoefficients#getScale <em>Scale</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Scale</em>' attribute.
	 * @see #getScale()
	 * @generated
	 */
	void setScale(String value);

} // IntegerCoefficients

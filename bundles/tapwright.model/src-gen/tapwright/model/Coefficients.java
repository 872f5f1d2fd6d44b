/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Coefficients</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * The coefficients h[0..N-1] of a filter, exactly.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.Coefficients#getDesignHash <em>Design Hash</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getCoefficients()
 * @model abstract="true"
 * @generated
 */
public interface Coefficients extends EObject {
	/**
	 * Returns the value of the '<em><b>Design Hash</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Content hash of the design that computed them and of the numbers it used; empty when they were given.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Design Hash</em>' attribute.
	 * @see #setDesignHash(String)
	 * @see tapwright.model.ModelPackage#getCoefficients_DesignHash()
	 * @model
	 * @generated
	 */
	String getDesignHash();

	/**
	 * Sets the value of the '{@link tapwright.model.Coefficients#getDesignHash <em>Design Hash</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Design Hash</em>' attribute.
	 * @see #getDesignHash()
	 * @generated
	 */
	void setDesignHash(String value);

} // Coefficients

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Real Coefficients</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Coefficients as IEEE 754 doubles; each is the rational number that it is.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.RealCoefficients#getValues <em>Values</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getRealCoefficients()
 * @model annotation="urn:tapwright:meta json='values'"
 * @generated
 */
public interface RealCoefficients extends Coefficients {
	/**
	 * Returns the value of the '<em><b>Values</b></em>' attribute list.
	 * The list contents are of type {@link java.lang.Double}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * h[0..N-1], a plain number each.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Values</em>' attribute list.
	 * @see tapwright.model.ModelPackage#getRealCoefficients_Values()
	 * @model unique="false"
	 * @generated
	 */
	EList<Double> getValues();

} // RealCoefficients

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Least Squares Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Smallest weighted squared error. Nulls and exact gains that the requirements ask for hold exactly.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.LeastSquaresDesign#getType <em>Type</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getLeastSquaresDesign()
 * @model annotation="urn:tapwright:meta method='least-squares' label='Least squares'"
 * @generated
 */
public interface LeastSquaresDesign extends BandDesign {
	/**
	 * Returns the value of the '<em><b>Type</b></em>' attribute.
	 * The literals are from the enumeration {@link tapwright.model.PhaseType}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Kind of linear phase; type I or II by the number of taps when any.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Type</em>' attribute.
	 * @see tapwright.model.PhaseType
	 * @see #setType(PhaseType)
	 * @see tapwright.model.ModelPackage#getLeastSquaresDesign_Type()
	 * @model
	 * @generated
	 */
	PhaseType getType();

	/**
	 * Sets the value of the '{@link tapwright.model.LeastSquaresDesign#getType <em>Type</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Type</em>' attribute.
	 * @see tapwright.model.PhaseType
	 * @see #getType()
	 * @generated
	 */
	void setType(PhaseType value);

} // LeastSquaresDesign

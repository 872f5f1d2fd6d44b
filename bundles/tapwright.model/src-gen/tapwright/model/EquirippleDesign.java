/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Equiripple Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Smallest largest weighted error, by the exchange algorithm of Parks and McClellan (1972).
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.EquirippleDesign#getType <em>Type</em>}</li>
 *   <li>{@link tapwright.model.EquirippleDesign#getTolerance <em>Tolerance</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getEquirippleDesign()
 * @model annotation="urn:tapwright:meta method='equiripple' label='Equiripple'"
 * @generated
 */
public interface EquirippleDesign extends BandDesign {
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
	 * @see tapwright.model.ModelPackage#getEquirippleDesign_Type()
	 * @model
	 * @generated
	 */
	PhaseType getType();

	/**
	 * Sets the value of the '{@link tapwright.model.EquirippleDesign#getType <em>Type</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Type</em>' attribute.
	 * @see tapwright.model.PhaseType
	 * @see #getType()
	 * @generated
	 */
	void setType(PhaseType value);

	/**
	 * Returns the value of the '<em><b>Tolerance</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Relative distance from the optimum at which the exchange stops; 0.0001 when empty.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Tolerance</em>' attribute.
	 * @see #setTolerance(String)
	 * @see tapwright.model.ModelPackage#getEquirippleDesign_Tolerance()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getTolerance();

	/**
	 * Sets the value of the '{@link tapwright.model.EquirippleDesign#getTolerance <em>Tolerance</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Tolerance</em>' attribute.
	 * @see #getTolerance()
	 * @generated
	 */
	void setTolerance(String value);

} // EquirippleDesign

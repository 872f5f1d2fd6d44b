/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Savitzky Golay Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Smoothing or differentiation by a polynomial that is fitted to the last samples (Savitzky and Golay, 1964).
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.SavitzkyGolayDesign#getPoints <em>Points</em>}</li>
 *   <li>{@link tapwright.model.SavitzkyGolayDesign#getDegree <em>Degree</em>}</li>
 *   <li>{@link tapwright.model.SavitzkyGolayDesign#getDerivative <em>Derivative</em>}</li>
 *   <li>{@link tapwright.model.SavitzkyGolayDesign#getPosition <em>Position</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getSavitzkyGolayDesign()
 * @model annotation="urn:tapwright:meta method='savitzky-golay' label='Savitzky-Golay'"
 * @generated
 */
public interface SavitzkyGolayDesign extends Design {
	/**
	 * Returns the value of the '<em><b>Points</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Number of samples, odd.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Points</em>' attribute.
	 * @see #setPoints(String)
	 * @see tapwright.model.ModelPackage#getSavitzkyGolayDesign_Points()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getPoints();

	/**
	 * Sets the value of the '{@link tapwright.model.SavitzkyGolayDesign#getPoints <em>Points</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Points</em>' attribute.
	 * @see #getPoints()
	 * @generated
	 */
	void setPoints(String value);

	/**
	 * Returns the value of the '<em><b>Degree</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Degree of the polynomial.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Degree</em>' attribute.
	 * @see #setDegree(String)
	 * @see tapwright.model.ModelPackage#getSavitzkyGolayDesign_Degree()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getDegree();

	/**
	 * Sets the value of the '{@link tapwright.model.SavitzkyGolayDesign#getDegree <em>Degree</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Degree</em>' attribute.
	 * @see #getDegree()
	 * @generated
	 */
	void setDegree(String value);

	/**
	 * Returns the value of the '<em><b>Derivative</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Which derivative, per sample; 0 smooths, also when empty.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Derivative</em>' attribute.
	 * @see #setDerivative(String)
	 * @see tapwright.model.ModelPackage#getSavitzkyGolayDesign_Derivative()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getDerivative();

	/**
	 * Sets the value of the '{@link tapwright.model.SavitzkyGolayDesign#getDerivative <em>Derivative</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Derivative</em>' attribute.
	 * @see #getDerivative()
	 * @generated
	 */
	void setDerivative(String value);

	/**
	 * Returns the value of the '<em><b>Position</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Where the polynomial is evaluated, in samples from the middle; positive is toward the newest.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Position</em>' attribute.
	 * @see #setPosition(String)
	 * @see tapwright.model.ModelPackage#getSavitzkyGolayDesign_Position()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getPosition();

	/**
	 * Sets the value of the '{@link tapwright.model.SavitzkyGolayDesign#getPosition <em>Position</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Position</em>' attribute.
	 * @see #getPosition()
	 * @generated
	 */
	void setPosition(String value);

} // SavitzkyGolayDesign

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Result</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * What was proven of one requirement.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.Result#getRequirement <em>Requirement</em>}</li>
 *   <li>{@link tapwright.model.Result#getKind <em>Kind</em>}</li>
 *   <li>{@link tapwright.model.Result#getVerdict <em>Verdict</em>}</li>
 *   <li>{@link tapwright.model.Result#getWorst <em>Worst</em>}</li>
 *   <li>{@link tapwright.model.Result#getValueLow <em>Value Low</em>}</li>
 *   <li>{@link tapwright.model.Result#getValueHigh <em>Value High</em>}</li>
 *   <li>{@link tapwright.model.Result#getLimit <em>Limit</em>}</li>
 *   <li>{@link tapwright.model.Result#getMarginLow <em>Margin Low</em>}</li>
 *   <li>{@link tapwright.model.Result#getMarginHigh <em>Margin High</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getResult()
 * @model
 * @generated
 */
public interface Result extends EObject {
	/**
	 * Returns the value of the '<em><b>Requirement</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Id of the requirement.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Requirement</em>' attribute.
	 * @see #setRequirement(String)
	 * @see tapwright.model.ModelPackage#getResult_Requirement()
	 * @model
	 * @generated
	 */
	String getRequirement();

	/**
	 * Sets the value of the '{@link tapwright.model.Result#getRequirement <em>Requirement</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Requirement</em>' attribute.
	 * @see #getRequirement()
	 * @generated
	 */
	void setRequirement(String value);

	/**
	 * Returns the value of the '<em><b>Kind</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Kind of the requirement.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Kind</em>' attribute.
	 * @see #setKind(String)
	 * @see tapwright.model.ModelPackage#getResult_Kind()
	 * @model
	 * @generated
	 */
	String getKind();

	/**
	 * Sets the value of the '{@link tapwright.model.Result#getKind <em>Kind</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Kind</em>' attribute.
	 * @see #getKind()
	 * @generated
	 */
	void setKind(String value);

	/**
	 * Returns the value of the '<em><b>Verdict</b></em>' attribute.
	 * The literals are from the enumeration {@link tapwright.model.Verdict}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What was proven.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Verdict</em>' attribute.
	 * @see tapwright.model.Verdict
	 * @see #setVerdict(Verdict)
	 * @see tapwright.model.ModelPackage#getResult_Verdict()
	 * @model
	 * @generated
	 */
	Verdict getVerdict();

	/**
	 * Sets the value of the '{@link tapwright.model.Result#getVerdict <em>Verdict</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Verdict</em>' attribute.
	 * @see tapwright.model.Verdict
	 * @see #getVerdict()
	 * @generated
	 */
	void setVerdict(Verdict value);

	/**
	 * Returns the value of the '<em><b>Worst</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Where the margin is smallest, in the unit of the kind; NaN without a place.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Worst</em>' attribute.
	 * @see #setWorst(double)
	 * @see tapwright.model.ModelPackage#getResult_Worst()
	 * @model
	 * @generated
	 */
	double getWorst();

	/**
	 * Sets the value of the '{@link tapwright.model.Result#getWorst <em>Worst</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Worst</em>' attribute.
	 * @see #getWorst()
	 * @generated
	 */
	void setWorst(double value);

	/**
	 * Returns the value of the '<em><b>Value Low</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Lower end of the enclosure of the worst value, in the unit of the limit.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Value Low</em>' attribute.
	 * @see #setValueLow(double)
	 * @see tapwright.model.ModelPackage#getResult_ValueLow()
	 * @model
	 * @generated
	 */
	double getValueLow();

	/**
	 * Sets the value of the '{@link tapwright.model.Result#getValueLow <em>Value Low</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Value Low</em>' attribute.
	 * @see #getValueLow()
	 * @generated
	 */
	void setValueLow(double value);

	/**
	 * Returns the value of the '<em><b>Value High</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Upper end of the enclosure of the worst value.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Value High</em>' attribute.
	 * @see #setValueHigh(double)
	 * @see tapwright.model.ModelPackage#getResult_ValueHigh()
	 * @model
	 * @generated
	 */
	double getValueHigh();

	/**
	 * Sets the value of the '{@link tapwright.model.Result#getValueHigh <em>Value High</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Value High</em>' attribute.
	 * @see #getValueHigh()
	 * @generated
	 */
	void setValueHigh(double value);

	/**
	 * Returns the value of the '<em><b>Limit</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The limit at that place.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Limit</em>' attribute.
	 * @see #setLimit(double)
	 * @see tapwright.model.ModelPackage#getResult_Limit()
	 * @model
	 * @generated
	 */
	double getLimit();

	/**
	 * Sets the value of the '{@link tapwright.model.Result#getLimit <em>Limit</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Limit</em>' attribute.
	 * @see #getLimit()
	 * @generated
	 */
	void setLimit(double value);

	/**
	 * Returns the value of the '<em><b>Margin Low</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Lower end of the enclosure of the margin, in the unit of the limit.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Margin Low</em>' attribute.
	 * @see #setMarginLow(double)
	 * @see tapwright.model.ModelPackage#getResult_MarginLow()
	 * @model
	 * @generated
	 */
	double getMarginLow();

	/**
	 * Sets the value of the '{@link tapwright.model.Result#getMarginLow <em>Margin Low</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Margin Low</em>' attribute.
	 * @see #getMarginLow()
	 * @generated
	 */
	void setMarginLow(double value);

	/**
	 * Returns the value of the '<em><b>Margin High</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Upper end of the enclosure of the margin.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Margin High</em>' attribute.
	 * @see #setMarginHigh(double)
	 * @see tapwright.model.ModelPackage#getResult_MarginHigh()
	 * @model
	 * @generated
	 */
	double getMarginHigh();

	/**
	 * Sets the value of the '{@link tapwright.model.Result#getMarginHigh <em>Margin High</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Margin High</em>' attribute.
	 * @see #getMarginHigh()
	 * @generated
	 */
	void setMarginHigh(double value);

} // Result

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Evidence</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Results of one verification, kept with a revision.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.Evidence#getTool <em>Tool</em>}</li>
 *   <li>{@link tapwright.model.Evidence#getVerdict <em>Verdict</em>}</li>
 *   <li>{@link tapwright.model.Evidence#getResults <em>Results</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getEvidence()
 * @model
 * @generated
 */
public interface Evidence extends EObject {
	/**
	 * Returns the value of the '<em><b>Tool</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Name and version of the program.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Tool</em>' attribute.
	 * @see #setTool(String)
	 * @see tapwright.model.ModelPackage#getEvidence_Tool()
	 * @model
	 * @generated
	 */
	String getTool();

	/**
	 * Sets the value of the '{@link tapwright.model.Evidence#getTool <em>Tool</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Tool</em>' attribute.
	 * @see #getTool()
	 * @generated
	 */
	void setTool(String value);

	/**
	 * Returns the value of the '<em><b>Verdict</b></em>' attribute.
	 * The literals are from the enumeration {@link tapwright.model.Verdict}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The gravest of the results.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Verdict</em>' attribute.
	 * @see tapwright.model.Verdict
	 * @see #setVerdict(Verdict)
	 * @see tapwright.model.ModelPackage#getEvidence_Verdict()
	 * @model
	 * @generated
	 */
	Verdict getVerdict();

	/**
	 * Sets the value of the '{@link tapwright.model.Evidence#getVerdict <em>Verdict</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Verdict</em>' attribute.
	 * @see tapwright.model.Verdict
	 * @see #getVerdict()
	 * @generated
	 */
	void setVerdict(Verdict value);

	/**
	 * Returns the value of the '<em><b>Results</b></em>' containment reference list.
	 * The list contents are of type {@link tapwright.model.Result}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * One for each requirement.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Results</em>' containment reference list.
	 * @see tapwright.model.ModelPackage#getEvidence_Results()
	 * @model containment="true"
	 * @generated
	 */
	EList<Result> getResults();

} // Evidence

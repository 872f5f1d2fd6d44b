/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Filter</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * One digital filter with a finite impulse response: root of a file NAME.filter.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.Filter#getName <em>Name</em>}</li>
 *   <li>{@link tapwright.model.Filter#getIdentity <em>Identity</em>}</li>
 *   <li>{@link tapwright.model.Filter#getPurpose <em>Purpose</em>}</li>
 *   <li>{@link tapwright.model.Filter#getSampleRate <em>Sample Rate</em>}</li>
 *   <li>{@link tapwright.model.Filter#getRequirements <em>Requirements</em>}</li>
 *   <li>{@link tapwright.model.Filter#getDesign <em>Design</em>}</li>
 *   <li>{@link tapwright.model.Filter#getCoefficients <em>Coefficients</em>}</li>
 *   <li>{@link tapwright.model.Filter#getArithmetic <em>Arithmetic</em>}</li>
 *   <li>{@link tapwright.model.Filter#getDeployments <em>Deployments</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getFilter()
 * @model
 * @generated
 */
public interface Filter extends EObject {
	/**
	 * Returns the value of the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Name of the filter; the file has the same name.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Name</em>' attribute.
	 * @see #setName(String)
	 * @see tapwright.model.ModelPackage#getFilter_Name()
	 * @model
	 * @generated
	 */
	String getName();

	/**
	 * Sets the value of the '{@link tapwright.model.Filter#getName <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Name</em>' attribute.
	 * @see #getName()
	 * @generated
	 */
	void setName(String value);

	/**
	 * Returns the value of the '<em><b>Identity</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Stays the same through renames and revisions; made once, at random.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Identity</em>' attribute.
	 * @see #setIdentity(String)
	 * @see tapwright.model.ModelPackage#getFilter_Identity()
	 * @model
	 * @generated
	 */
	String getIdentity();

	/**
	 * Sets the value of the '{@link tapwright.model.Filter#getIdentity <em>Identity</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Identity</em>' attribute.
	 * @see #getIdentity()
	 * @generated
	 */
	void setIdentity(String value);

	/**
	 * Returns the value of the '<em><b>Purpose</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What the filter is for, for a reader.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Purpose</em>' attribute.
	 * @see #setPurpose(String)
	 * @see tapwright.model.ModelPackage#getFilter_Purpose()
	 * @model
	 * @generated
	 */
	String getPurpose();

	/**
	 * Sets the value of the '{@link tapwright.model.Filter#getPurpose <em>Purpose</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Purpose</em>' attribute.
	 * @see #getPurpose()
	 * @generated
	 */
	void setPurpose(String value);

	/**
	 * Returns the value of the '<em><b>Sample Rate</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Sample rate at its input in Hz.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Sample Rate</em>' attribute.
	 * @see #setSampleRate(String)
	 * @see tapwright.model.ModelPackage#getFilter_SampleRate()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getSampleRate();

	/**
	 * Sets the value of the '{@link tapwright.model.Filter#getSampleRate <em>Sample Rate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Sample Rate</em>' attribute.
	 * @see #getSampleRate()
	 * @generated
	 */
	void setSampleRate(String value);

	/**
	 * Returns the value of the '<em><b>Requirements</b></em>' containment reference list.
	 * The list contents are of type {@link tapwright.model.Requirement}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What is asked of the filter.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Requirements</em>' containment reference list.
	 * @see tapwright.model.ModelPackage#getFilter_Requirements()
	 * @model containment="true"
	 * @generated
	 */
	EList<Requirement> getRequirements();

	/**
	 * Returns the value of the '<em><b>Design</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Where the coefficients come from.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Design</em>' containment reference.
	 * @see #setDesign(Design)
	 * @see tapwright.model.ModelPackage#getFilter_Design()
	 * @model containment="true"
	 * @generated
	 */
	Design getDesign();

	/**
	 * Sets the value of the '{@link tapwright.model.Filter#getDesign <em>Design</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Design</em>' containment reference.
	 * @see #getDesign()
	 * @generated
	 */
	void setDesign(Design value);

	/**
	 * Returns the value of the '<em><b>Coefficients</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The numbers h[0..N-1].
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Coefficients</em>' containment reference.
	 * @see #setCoefficients(Coefficients)
	 * @see tapwright.model.ModelPackage#getFilter_Coefficients()
	 * @model containment="true"
	 * @generated
	 */
	Coefficients getCoefficients();

	/**
	 * Sets the value of the '{@link tapwright.model.Filter#getCoefficients <em>Coefficients</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Coefficients</em>' containment reference.
	 * @see #getCoefficients()
	 * @generated
	 */
	void setCoefficients(Coefficients value);

	/**
	 * Returns the value of the '<em><b>Arithmetic</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Structure and number formats that the filter runs in.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Arithmetic</em>' containment reference.
	 * @see #setArithmetic(Arithmetic)
	 * @see tapwright.model.ModelPackage#getFilter_Arithmetic()
	 * @model containment="true"
	 * @generated
	 */
	Arithmetic getArithmetic();

	/**
	 * Sets the value of the '{@link tapwright.model.Filter#getArithmetic <em>Arithmetic</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Arithmetic</em>' containment reference.
	 * @see #getArithmetic()
	 * @generated
	 */
	void setArithmetic(Arithmetic value);

	/**
	 * Returns the value of the '<em><b>Deployments</b></em>' containment reference list.
	 * The list contents are of type {@link tapwright.model.Deployment}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Where the filter runs.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Deployments</em>' containment reference list.
	 * @see tapwright.model.ModelPackage#getFilter_Deployments()
	 * @model containment="true"
	 * @generated
	 */
	EList<Deployment> getDeployments();

} // Filter

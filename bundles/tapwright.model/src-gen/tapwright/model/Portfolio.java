/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.common.util.EList;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Portfolio</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * All filters of one product: root of the file portfolio.tapwright. The filters are the .filter files in the same folder and below.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.Portfolio#getName <em>Name</em>}</li>
 *   <li>{@link tapwright.model.Portfolio#getDescription <em>Description</em>}</li>
 *   <li>{@link tapwright.model.Portfolio#getErosion <em>Erosion</em>}</li>
 *   <li>{@link tapwright.model.Portfolio#getActiveBaseline <em>Active Baseline</em>}</li>
 *   <li>{@link tapwright.model.Portfolio#getParameters <em>Parameters</em>}</li>
 *   <li>{@link tapwright.model.Portfolio#getProcessors <em>Processors</em>}</li>
 *   <li>{@link tapwright.model.Portfolio#getPaths <em>Paths</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getPortfolio()
 * @model
 * @generated
 */
public interface Portfolio extends EObject {
	/**
	 * Returns the value of the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Name of the product.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Name</em>' attribute.
	 * @see #setName(String)
	 * @see tapwright.model.ModelPackage#getPortfolio_Name()
	 * @model
	 * @generated
	 */
	String getName();

	/**
	 * Sets the value of the '{@link tapwright.model.Portfolio#getName <em>Name</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Name</em>' attribute.
	 * @see #getName()
	 * @generated
	 */
	void setName(String value);

	/**
	 * Returns the value of the '<em><b>Description</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What the product is, for a reader.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Description</em>' attribute.
	 * @see #setDescription(String)
	 * @see tapwright.model.ModelPackage#getPortfolio_Description()
	 * @model
	 * @generated
	 */
	String getDescription();

	/**
	 * Sets the value of the '{@link tapwright.model.Portfolio#getDescription <em>Description</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Description</em>' attribute.
	 * @see #getDescription()
	 * @generated
	 */
	void setDescription(String value);

	/**
	 * Returns the value of the '<em><b>Erosion</b></em>' attribute.
	 * The default value is <code>"0.5"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * A margin that shrank by more than this since the last revision or the active baseline is reported.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Erosion</em>' attribute.
	 * @see #setErosion(String)
	 * @see tapwright.model.ModelPackage#getPortfolio_Erosion()
	 * @model default="0.5" dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='dB'"
	 * @generated
	 */
	String getErosion();

	/**
	 * Sets the value of the '{@link tapwright.model.Portfolio#getErosion <em>Erosion</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Erosion</em>' attribute.
	 * @see #getErosion()
	 * @generated
	 */
	void setErosion(String value);

	/**
	 * Returns the value of the '<em><b>Active Baseline</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Name of the baseline that regressions are judged against; none when empty.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Active Baseline</em>' attribute.
	 * @see #setActiveBaseline(String)
	 * @see tapwright.model.ModelPackage#getPortfolio_ActiveBaseline()
	 * @model
	 * @generated
	 */
	String getActiveBaseline();

	/**
	 * Sets the value of the '{@link tapwright.model.Portfolio#getActiveBaseline <em>Active Baseline</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Active Baseline</em>' attribute.
	 * @see #getActiveBaseline()
	 * @generated
	 */
	void setActiveBaseline(String value);

	/**
	 * Returns the value of the '<em><b>Parameters</b></em>' containment reference list.
	 * The list contents are of type {@link tapwright.model.Parameter}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Named numbers that filters may use in place of numbers.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Parameters</em>' containment reference list.
	 * @see tapwright.model.ModelPackage#getPortfolio_Parameters()
	 * @model containment="true"
	 * @generated
	 */
	EList<Parameter> getParameters();

	/**
	 * Returns the value of the '<em><b>Processors</b></em>' containment reference list.
	 * The list contents are of type {@link tapwright.model.Processor}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What the filters run on.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Processors</em>' containment reference list.
	 * @see tapwright.model.ModelPackage#getPortfolio_Processors()
	 * @model containment="true"
	 * @generated
	 */
	EList<Processor> getProcessors();

	/**
	 * Returns the value of the '<em><b>Paths</b></em>' containment reference list.
	 * The list contents are of type {@link tapwright.model.SignalPath}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Chains of filters with requirements from end to end.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Paths</em>' containment reference list.
	 * @see tapwright.model.ModelPackage#getPortfolio_Paths()
	 * @model containment="true"
	 * @generated
	 */
	EList<SignalPath> getPaths();

} // Portfolio

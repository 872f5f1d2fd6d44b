/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Processor</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A compute target.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.Processor#getName <em>Name</em>}</li>
 *   <li>{@link tapwright.model.Processor#getDescription <em>Description</em>}</li>
 *   <li>{@link tapwright.model.Processor#getMacRate <em>Mac Rate</em>}</li>
 *   <li>{@link tapwright.model.Processor#getWord <em>Word</em>}</li>
 *   <li>{@link tapwright.model.Processor#getAccumulator <em>Accumulator</em>}</li>
 *   <li>{@link tapwright.model.Processor#getCoefficientMemory <em>Coefficient Memory</em>}</li>
 *   <li>{@link tapwright.model.Processor#getDelayMemory <em>Delay Memory</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getProcessor()
 * @model
 * @generated
 */
public interface Processor extends EObject {
	/**
	 * Returns the value of the '<em><b>Name</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Name that deployments refer to.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Name</em>' attribute.
	 * @see #setName(String)
	 * @see tapwright.model.ModelPackage#getProcessor_Name()
	 * @model
	 * @generated
	 */
	String getName();

	/**
	 * Sets the value of the '{@link tapwright.model.Processor#getName <em>Name</em>}' attribute.
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
	 * What it is, for a reader.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Description</em>' attribute.
	 * @see #setDescription(String)
	 * @see tapwright.model.ModelPackage#getProcessor_Description()
	 * @model
	 * @generated
	 */
	String getDescription();

	/**
	 * Sets the value of the '{@link tapwright.model.Processor#getDescription <em>Description</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Description</em>' attribute.
	 * @see #getDescription()
	 * @generated
	 */
	void setDescription(String value);

	/**
	 * Returns the value of the '<em><b>Mac Rate</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Multiply-accumulate operations per second that are available to filters.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Mac Rate</em>' attribute.
	 * @see #setMacRate(String)
	 * @see tapwright.model.ModelPackage#getProcessor_MacRate()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getMacRate();

	/**
	 * Sets the value of the '{@link tapwright.model.Processor#getMacRate <em>Mac Rate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Mac Rate</em>' attribute.
	 * @see #getMacRate()
	 * @generated
	 */
	void setMacRate(String value);

	/**
	 * Returns the value of the '<em><b>Word</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Word length of the multiplier inputs in bits.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Word</em>' attribute.
	 * @see #setWord(String)
	 * @see tapwright.model.ModelPackage#getProcessor_Word()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='bit'"
	 * @generated
	 */
	String getWord();

	/**
	 * Sets the value of the '{@link tapwright.model.Processor#getWord <em>Word</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Word</em>' attribute.
	 * @see #getWord()
	 * @generated
	 */
	void setWord(String value);

	/**
	 * Returns the value of the '<em><b>Accumulator</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Length of the accumulator in bits.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Accumulator</em>' attribute.
	 * @see #setAccumulator(String)
	 * @see tapwright.model.ModelPackage#getProcessor_Accumulator()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='bit'"
	 * @generated
	 */
	String getAccumulator();

	/**
	 * Sets the value of the '{@link tapwright.model.Processor#getAccumulator <em>Accumulator</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Accumulator</em>' attribute.
	 * @see #getAccumulator()
	 * @generated
	 */
	void setAccumulator(String value);

	/**
	 * Returns the value of the '<em><b>Coefficient Memory</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Words available for coefficients.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Coefficient Memory</em>' attribute.
	 * @see #setCoefficientMemory(String)
	 * @see tapwright.model.ModelPackage#getProcessor_CoefficientMemory()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getCoefficientMemory();

	/**
	 * Sets the value of the '{@link tapwright.model.Processor#getCoefficientMemory <em>Coefficient Memory</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Coefficient Memory</em>' attribute.
	 * @see #getCoefficientMemory()
	 * @generated
	 */
	void setCoefficientMemory(String value);

	/**
	 * Returns the value of the '<em><b>Delay Memory</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Words available for delay lines.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Delay Memory</em>' attribute.
	 * @see #setDelayMemory(String)
	 * @see tapwright.model.ModelPackage#getProcessor_DelayMemory()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getDelayMemory();

	/**
	 * Sets the value of the '{@link tapwright.model.Processor#getDelayMemory <em>Delay Memory</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Delay Memory</em>' attribute.
	 * @see #getDelayMemory()
	 * @generated
	 */
	void setDelayMemory(String value);

} // Processor

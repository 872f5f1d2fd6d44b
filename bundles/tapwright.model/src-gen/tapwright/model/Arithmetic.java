/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Arithmetic</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Structure and number formats that a filter runs in. A format that is missing puts no bound on its node.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.Arithmetic#getStructure <em>Structure</em>}</li>
 *   <li>{@link tapwright.model.Arithmetic#getFactor <em>Factor</em>}</li>
 *   <li>{@link tapwright.model.Arithmetic#getCoefficient <em>Coefficient</em>}</li>
 *   <li>{@link tapwright.model.Arithmetic#getInput <em>Input</em>}</li>
 *   <li>{@link tapwright.model.Arithmetic#getProduct <em>Product</em>}</li>
 *   <li>{@link tapwright.model.Arithmetic#getAccumulator <em>Accumulator</em>}</li>
 *   <li>{@link tapwright.model.Arithmetic#getOutput <em>Output</em>}</li>
 *   <li>{@link tapwright.model.Arithmetic#getRounding <em>Rounding</em>}</li>
 *   <li>{@link tapwright.model.Arithmetic#getOverflow <em>Overflow</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getArithmetic()
 * @model
 * @generated
 */
public interface Arithmetic extends EObject {
	/**
	 * Returns the value of the '<em><b>Structure</b></em>' attribute.
	 * The literals are from the enumeration {@link tapwright.model.Structure}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Order of operations.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Structure</em>' attribute.
	 * @see tapwright.model.Structure
	 * @see #setStructure(Structure)
	 * @see tapwright.model.ModelPackage#getArithmetic_Structure()
	 * @model
	 * @generated
	 */
	Structure getStructure();

	/**
	 * Sets the value of the '{@link tapwright.model.Arithmetic#getStructure <em>Structure</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Structure</em>' attribute.
	 * @see tapwright.model.Structure
	 * @see #getStructure()
	 * @generated
	 */
	void setStructure(Structure value);

	/**
	 * Returns the value of the '<em><b>Factor</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Rate factor of polyphase and half-band structures; 1 when empty.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Factor</em>' attribute.
	 * @see #setFactor(String)
	 * @see tapwright.model.ModelPackage#getArithmetic_Factor()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getFactor();

	/**
	 * Sets the value of the '{@link tapwright.model.Arithmetic#getFactor <em>Factor</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Factor</em>' attribute.
	 * @see #getFactor()
	 * @generated
	 */
	void setFactor(String value);

	/**
	 * Returns the value of the '<em><b>Coefficient</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Format of the coefficients.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Coefficient</em>' containment reference.
	 * @see #setCoefficient(Format)
	 * @see tapwright.model.ModelPackage#getArithmetic_Coefficient()
	 * @model containment="true"
	 * @generated
	 */
	Format getCoefficient();

	/**
	 * Sets the value of the '{@link tapwright.model.Arithmetic#getCoefficient <em>Coefficient</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Coefficient</em>' containment reference.
	 * @see #getCoefficient()
	 * @generated
	 */
	void setCoefficient(Format value);

	/**
	 * Returns the value of the '<em><b>Input</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Format of the input samples.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Input</em>' containment reference.
	 * @see #setInput(Format)
	 * @see tapwright.model.ModelPackage#getArithmetic_Input()
	 * @model containment="true"
	 * @generated
	 */
	Format getInput();

	/**
	 * Sets the value of the '{@link tapwright.model.Arithmetic#getInput <em>Input</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Input</em>' containment reference.
	 * @see #getInput()
	 * @generated
	 */
	void setInput(Format value);

	/**
	 * Returns the value of the '<em><b>Product</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Format that every product is rounded to; exact when missing.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Product</em>' containment reference.
	 * @see #setProduct(Format)
	 * @see tapwright.model.ModelPackage#getArithmetic_Product()
	 * @model containment="true"
	 * @generated
	 */
	Format getProduct();

	/**
	 * Sets the value of the '{@link tapwright.model.Arithmetic#getProduct <em>Product</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Product</em>' containment reference.
	 * @see #getProduct()
	 * @generated
	 */
	void setProduct(Format value);

	/**
	 * Returns the value of the '<em><b>Accumulator</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Format of the running sum.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Accumulator</em>' containment reference.
	 * @see #setAccumulator(Format)
	 * @see tapwright.model.ModelPackage#getArithmetic_Accumulator()
	 * @model containment="true"
	 * @generated
	 */
	Format getAccumulator();

	/**
	 * Sets the value of the '{@link tapwright.model.Arithmetic#getAccumulator <em>Accumulator</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Accumulator</em>' containment reference.
	 * @see #getAccumulator()
	 * @generated
	 */
	void setAccumulator(Format value);

	/**
	 * Returns the value of the '<em><b>Output</b></em>' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Format of the output samples.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Output</em>' containment reference.
	 * @see #setOutput(Format)
	 * @see tapwright.model.ModelPackage#getArithmetic_Output()
	 * @model containment="true"
	 * @generated
	 */
	Format getOutput();

	/**
	 * Sets the value of the '{@link tapwright.model.Arithmetic#getOutput <em>Output</em>}' containment reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Output</em>' containment reference.
	 * @see #getOutput()
	 * @generated
	 */
	void setOutput(Format value);

	/**
	 * Returns the value of the '<em><b>Rounding</b></em>' attribute.
	 * The default value is <code>"half-even"</code>.
	 * The literals are from the enumeration {@link tapwright.model.Rounding}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Wherever bits are dropped.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Rounding</em>' attribute.
	 * @see tapwright.model.Rounding
	 * @see #setRounding(Rounding)
	 * @see tapwright.model.ModelPackage#getArithmetic_Rounding()
	 * @model default="half-even"
	 * @generated
	 */
	Rounding getRounding();

	/**
	 * Sets the value of the '{@link tapwright.model.Arithmetic#getRounding <em>Rounding</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Rounding</em>' attribute.
	 * @see tapwright.model.Rounding
	 * @see #getRounding()
	 * @generated
	 */
	void setRounding(Rounding value);

	/**
	 * Returns the value of the '<em><b>Overflow</b></em>' attribute.
	 * The default value is <code>"saturate"</code>.
	 * The literals are from the enumeration {@link tapwright.model.Overflow}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * In the accumulator and at the output.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Overflow</em>' attribute.
	 * @see tapwright.model.Overflow
	 * @see #setOverflow(Overflow)
	 * @see tapwright.model.ModelPackage#getArithmetic_Overflow()
	 * @model default="saturate"
	 * @generated
	 */
	Overflow getOverflow();

	/**
	 * Sets the value of the '{@link tapwright.model.Arithmetic#getOverflow <em>Overflow</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Overflow</em>' attribute.
	 * @see tapwright.model.Overflow
	 * @see #getOverflow()
	 * @generated
	 */
	void setOverflow(Overflow value);

} // Arithmetic

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;


/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Raised Cosine Design</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * Pulse of a data transmission: the raised cosine or its square root, sampled and cut.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.RaisedCosineDesign#getRollOff <em>Roll Off</em>}</li>
 *   <li>{@link tapwright.model.RaisedCosineDesign#getSamplesPerSymbol <em>Samples Per Symbol</em>}</li>
 *   <li>{@link tapwright.model.RaisedCosineDesign#getSymbols <em>Symbols</em>}</li>
 *   <li>{@link tapwright.model.RaisedCosineDesign#isRoot <em>Root</em>}</li>
 *   <li>{@link tapwright.model.RaisedCosineDesign#getGain <em>Gain</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getRaisedCosineDesign()
 * @model annotation="urn:tapwright:meta method='raised-cosine' label='Raised cosine pulse'"
 * @generated
 */
public interface RaisedCosineDesign extends Design {
	/**
	 * Returns the value of the '<em><b>Roll Off</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Part of the band that rolls off, 0 to 1.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Roll Off</em>' attribute.
	 * @see #setRollOff(String)
	 * @see tapwright.model.ModelPackage#getRaisedCosineDesign_RollOff()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getRollOff();

	/**
	 * Sets the value of the '{@link tapwright.model.RaisedCosineDesign#getRollOff <em>Roll Off</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Roll Off</em>' attribute.
	 * @see #getRollOff()
	 * @generated
	 */
	void setRollOff(String value);

	/**
	 * Returns the value of the '<em><b>Samples Per Symbol</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Samples per symbol.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Samples Per Symbol</em>' attribute.
	 * @see #setSamplesPerSymbol(String)
	 * @see tapwright.model.ModelPackage#getRaisedCosineDesign_SamplesPerSymbol()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getSamplesPerSymbol();

	/**
	 * Sets the value of the '{@link tapwright.model.RaisedCosineDesign#getSamplesPerSymbol <em>Samples Per Symbol</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Samples Per Symbol</em>' attribute.
	 * @see #getSamplesPerSymbol()
	 * @generated
	 */
	void setSamplesPerSymbol(String value);

	/**
	 * Returns the value of the '<em><b>Symbols</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Length in symbols.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Symbols</em>' attribute.
	 * @see #setSymbols(String)
	 * @see tapwright.model.ModelPackage#getRaisedCosineDesign_Symbols()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='1'"
	 * @generated
	 */
	String getSymbols();

	/**
	 * Sets the value of the '{@link tapwright.model.RaisedCosineDesign#getSymbols <em>Symbols</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Symbols</em>' attribute.
	 * @see #getSymbols()
	 * @generated
	 */
	void setSymbols(String value);

	/**
	 * Returns the value of the '<em><b>Root</b></em>' attribute.
	 * The default value is <code>"true"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The square root, otherwise the raised cosine itself.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Root</em>' attribute.
	 * @see #setRoot(boolean)
	 * @see tapwright.model.ModelPackage#getRaisedCosineDesign_Root()
	 * @model default="true"
	 * @generated
	 */
	boolean isRoot();

	/**
	 * Sets the value of the '{@link tapwright.model.RaisedCosineDesign#isRoot <em>Root</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Root</em>' attribute.
	 * @see #isRoot()
	 * @generated
	 */
	void setRoot(boolean value);

	/**
	 * Returns the value of the '<em><b>Gain</b></em>' attribute.
	 * The literals are from the enumeration {@link tapwright.model.PulseGain}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * What the pulse is scaled to.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Gain</em>' attribute.
	 * @see tapwright.model.PulseGain
	 * @see #setGain(PulseGain)
	 * @see tapwright.model.ModelPackage#getRaisedCosineDesign_Gain()
	 * @model
	 * @generated
	 */
	PulseGain getGain();

	/**
	 * Sets the value of the '{@link tapwright.model.RaisedCosineDesign#getGain <em>Gain</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Gain</em>' attribute.
	 * @see tapwright.model.PulseGain
	 * @see #getGain()
	 * @generated
	 */
	void setGain(PulseGain value);

} // RaisedCosineDesign

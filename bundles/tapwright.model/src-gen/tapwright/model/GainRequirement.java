/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.common.util.EList;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Gain Requirement</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * The gain stays within limits over a band. Either a constant limit between two band edges (from, to, min, max), or a line through points (points, side, interpolate).
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.GainRequirement#getFrom <em>From</em>}</li>
 *   <li>{@link tapwright.model.GainRequirement#getTo <em>To</em>}</li>
 *   <li>{@link tapwright.model.GainRequirement#getMin <em>Min</em>}</li>
 *   <li>{@link tapwright.model.GainRequirement#getMax <em>Max</em>}</li>
 *   <li>{@link tapwright.model.GainRequirement#getPoints <em>Points</em>}</li>
 *   <li>{@link tapwright.model.GainRequirement#getSide <em>Side</em>}</li>
 *   <li>{@link tapwright.model.GainRequirement#getInterpolate <em>Interpolate</em>}</li>
 *   <li>{@link tapwright.model.GainRequirement#getReferenceAt <em>Reference At</em>}</li>
 *   <li>{@link tapwright.model.GainRequirement#getReferenceFrom <em>Reference From</em>}</li>
 *   <li>{@link tapwright.model.GainRequirement#getReferenceTo <em>Reference To</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getGainRequirement()
 * @model annotation="urn:tapwright:meta kind='gain' label='Gain'"
 * @generated
 */
public interface GainRequirement extends Requirement {
	/**
	 * Returns the value of the '<em><b>From</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Lower band edge in Hz.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>From</em>' attribute.
	 * @see #setFrom(String)
	 * @see tapwright.model.ModelPackage#getGainRequirement_From()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getFrom();

	/**
	 * Sets the value of the '{@link tapwright.model.GainRequirement#getFrom <em>From</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>From</em>' attribute.
	 * @see #getFrom()
	 * @generated
	 */
	void setFrom(String value);

	/**
	 * Returns the value of the '<em><b>To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Upper band edge in Hz.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>To</em>' attribute.
	 * @see #setTo(String)
	 * @see tapwright.model.ModelPackage#getGainRequirement_To()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getTo();

	/**
	 * Sets the value of the '{@link tapwright.model.GainRequirement#getTo <em>To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>To</em>' attribute.
	 * @see #getTo()
	 * @generated
	 */
	void setTo(String value);

	/**
	 * Returns the value of the '<em><b>Min</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Lowest gain in dB.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Min</em>' attribute.
	 * @see #setMin(String)
	 * @see tapwright.model.ModelPackage#getGainRequirement_Min()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='dB'"
	 * @generated
	 */
	String getMin();

	/**
	 * Sets the value of the '{@link tapwright.model.GainRequirement#getMin <em>Min</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Min</em>' attribute.
	 * @see #getMin()
	 * @generated
	 */
	void setMin(String value);

	/**
	 * Returns the value of the '<em><b>Max</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Highest gain in dB.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Max</em>' attribute.
	 * @see #setMax(String)
	 * @see tapwright.model.ModelPackage#getGainRequirement_Max()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='dB'"
	 * @generated
	 */
	String getMax();

	/**
	 * Sets the value of the '{@link tapwright.model.GainRequirement#getMax <em>Max</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Max</em>' attribute.
	 * @see #getMax()
	 * @generated
	 */
	void setMax(String value);

	/**
	 * Returns the value of the '<em><b>Points</b></em>' containment reference list.
	 * The list contents are of type {@link tapwright.model.LimitPoint}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Corners of a limit line, by rising frequency.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Points</em>' containment reference list.
	 * @see tapwright.model.ModelPackage#getGainRequirement_Points()
	 * @model containment="true"
	 *        annotation="urn:tapwright:meta json='pairs'"
	 * @generated
	 */
	EList<LimitPoint> getPoints();

	/**
	 * Returns the value of the '<em><b>Side</b></em>' attribute.
	 * The literals are from the enumeration {@link tapwright.model.Side}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Which side of the line is allowed.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Side</em>' attribute.
	 * @see tapwright.model.Side
	 * @see #setSide(Side)
	 * @see tapwright.model.ModelPackage#getGainRequirement_Side()
	 * @model
	 * @generated
	 */
	Side getSide();

	/**
	 * Sets the value of the '{@link tapwright.model.GainRequirement#getSide <em>Side</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Side</em>' attribute.
	 * @see tapwright.model.Side
	 * @see #getSide()
	 * @generated
	 */
	void setSide(Side value);

	/**
	 * Returns the value of the '<em><b>Interpolate</b></em>' attribute.
	 * The literals are from the enumeration {@link tapwright.model.Interpolation}.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * How the line runs between its points.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Interpolate</em>' attribute.
	 * @see tapwright.model.Interpolation
	 * @see #setInterpolate(Interpolation)
	 * @see tapwright.model.ModelPackage#getGainRequirement_Interpolate()
	 * @model
	 * @generated
	 */
	Interpolation getInterpolate();

	/**
	 * Sets the value of the '{@link tapwright.model.GainRequirement#getInterpolate <em>Interpolate</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Interpolate</em>' attribute.
	 * @see tapwright.model.Interpolation
	 * @see #getInterpolate()
	 * @generated
	 */
	void setInterpolate(Interpolation value);

	/**
	 * Returns the value of the '<em><b>Reference At</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Limits are relative to the gain at this frequency in Hz.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Reference At</em>' attribute.
	 * @see #setReferenceAt(String)
	 * @see tapwright.model.ModelPackage#getGainRequirement_ReferenceAt()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getReferenceAt();

	/**
	 * Sets the value of the '{@link tapwright.model.GainRequirement#getReferenceAt <em>Reference At</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Reference At</em>' attribute.
	 * @see #getReferenceAt()
	 * @generated
	 */
	void setReferenceAt(String value);

	/**
	 * Returns the value of the '<em><b>Reference From</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Limits are relative to the largest gain of the band that starts here, in Hz.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Reference From</em>' attribute.
	 * @see #setReferenceFrom(String)
	 * @see tapwright.model.ModelPackage#getGainRequirement_ReferenceFrom()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getReferenceFrom();

	/**
	 * Sets the value of the '{@link tapwright.model.GainRequirement#getReferenceFrom <em>Reference From</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Reference From</em>' attribute.
	 * @see #getReferenceFrom()
	 * @generated
	 */
	void setReferenceFrom(String value);

	/**
	 * Returns the value of the '<em><b>Reference To</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Upper edge in Hz of the band whose largest gain is the reference.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Reference To</em>' attribute.
	 * @see #setReferenceTo(String)
	 * @see tapwright.model.ModelPackage#getGainRequirement_ReferenceTo()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='Hz'"
	 * @generated
	 */
	String getReferenceTo();

	/**
	 * Sets the value of the '{@link tapwright.model.GainRequirement#getReferenceTo <em>Reference To</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Reference To</em>' attribute.
	 * @see #getReferenceTo()
	 * @generated
	 */
	void setReferenceTo(String value);

} // GainRequirement

/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import org.eclipse.emf.ecore.EObject;

/**
 * <!-- begin-user-doc -->
 * A representation of the model object '<em><b>Format</b></em>'.
 * <!-- end-user-doc -->
 *
 * <!-- begin-model-doc -->
 * A binary fixed-point format.
 * <!-- end-model-doc -->
 *
 * <p>
 * The following features are supported:
 * </p>
 * <ul>
 *   <li>{@link tapwright.model.Format#getWord <em>Word</em>}</li>
 *   <li>{@link tapwright.model.Format#getFraction <em>Fraction</em>}</li>
 *   <li>{@link tapwright.model.Format#isSigned <em>Signed</em>}</li>
 * </ul>
 *
 * @see tapwright.model.ModelPackage#getFormat()
 * @model
 * @generated
 */
public interface Format extends EObject {
	/**
	 * Returns the value of the '<em><b>Word</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Bits in all.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Word</em>' attribute.
	 * @see #setWord(String)
	 * @see tapwright.model.ModelPackage#getFormat_Word()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='bit'"
	 * @generated
	 */
	String getWord();

	/**
	 * Sets the value of the '{@link tapwright.model.Format#getWord <em>Word</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Word</em>' attribute.
	 * @see #getWord()
	 * @generated
	 */
	void setWord(String value);

	/**
	 * Returns the value of the '<em><b>Fraction</b></em>' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Bits after the binary point.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Fraction</em>' attribute.
	 * @see #setFraction(String)
	 * @see tapwright.model.ModelPackage#getFormat_Fraction()
	 * @model dataType="tapwright.model.Quantity"
	 *        annotation="urn:tapwright:meta unit='bit'"
	 * @generated
	 */
	String getFraction();

	/**
	 * Sets the value of the '{@link tapwright.model.Format#getFraction <em>Fraction</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Fraction</em>' attribute.
	 * @see #getFraction()
	 * @generated
	 */
	void setFraction(String value);

	/**
	 * Returns the value of the '<em><b>Signed</b></em>' attribute.
	 * The default value is <code>"true"</code>.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Two's complement, otherwise unsigned.
	 * <!-- end-model-doc -->
	 * @return the value of the '<em>Signed</em>' attribute.
	 * @see #setSigned(boolean)
	 * @see tapwright.model.ModelPackage#getFormat_Signed()
	 * @model default="true"
	 * @generated
	 */
	boolean isSigned();

	/**
	 * Sets the value of the '{@link tapwright.model.Format#isSigned <em>Signed</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the new value of the '<em>Signed</em>' attribute.
	 * @see #isSigned()
	 * @generated
	 */
	void setSigned(boolean value);

} // Format

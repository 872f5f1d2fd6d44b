/**
 * SPDX-License-Identifier: EPL-2.0
 * Generated from model/tapwright.ecore: change the model, then run releng/generate-model.
 */
package tapwright.model;

import java.util.Arrays;
import java.util.Collections;
import java.util.List;

import org.eclipse.emf.common.util.Enumerator;

/**
 * <!-- begin-user-doc -->
 * A representation of the literals of the enumeration '<em><b>Structure</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * The order in which a filter multiplies and adds.
 * <!-- end-model-doc -->
 * @see tapwright.model.ModelPackage#getStructure()
 * @model
 * @generated
 */
public enum Structure implements Enumerator {
	/**
	 * The '<em><b>DIRECT</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Delay line, one multiplier per coefficient, one accumulator.
	 * <!-- end-model-doc -->
	 * @see #DIRECT_VALUE
	 * @generated
	 * @ordered
	 */
	DIRECT(0, "DIRECT", "direct"),

	/**
	 * The '<em><b>FOLDED</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Samples that share a coefficient are added before the multiplier; needs symmetric coefficients.
	 * <!-- end-model-doc -->
	 * @see #FOLDED_VALUE
	 * @generated
	 * @ordered
	 */
	FOLDED(1, "FOLDED", "folded"),

	/**
	 * The '<em><b>TRANSPOSED</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * One multiplier per coefficient, delays between the adders.
	 * <!-- end-model-doc -->
	 * @see #TRANSPOSED_VALUE
	 * @generated
	 * @ordered
	 */
	TRANSPOSED(2, "TRANSPOSED", "transposed"),

	/**
	 * The '<em><b>HALF BAND</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Like folded, but zero coefficients cost nothing; needs a half-band filter.
	 * <!-- end-model-doc -->
	 * @see #HALF_BAND_VALUE
	 * @generated
	 * @ordered
	 */
	HALF_BAND(3, "HALF_BAND", "half-band"),

	/**
	 * The '<em><b>POLYPHASE DECIMATOR</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Computes only the samples that are kept.
	 * <!-- end-model-doc -->
	 * @see #POLYPHASE_DECIMATOR_VALUE
	 * @generated
	 * @ordered
	 */
	POLYPHASE_DECIMATOR(4, "POLYPHASE_DECIMATOR", "polyphase-decimator"),

	/**
	 * The '<em><b>POLYPHASE INTERPOLATOR</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Leaves out the products with inserted zeros.
	 * <!-- end-model-doc -->
	 * @see #POLYPHASE_INTERPOLATOR_VALUE
	 * @generated
	 * @ordered
	 */
	POLYPHASE_INTERPOLATOR(5, "POLYPHASE_INTERPOLATOR", "polyphase-interpolator");

	/**
	 * The '<em><b>DIRECT</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Delay line, one multiplier per coefficient, one accumulator.
	 * <!-- end-model-doc -->
	 * @see #DIRECT
	 * @model literal="direct"
	 * @generated
	 * @ordered
	 */
	public static final int DIRECT_VALUE = 0;

	/**
	 * The '<em><b>FOLDED</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Samples that share a coefficient are added before the multiplier; needs symmetric coefficients.
	 * <!-- end-model-doc -->
	 * @see #FOLDED
	 * @model literal="folded"
	 * @generated
	 * @ordered
	 */
	public static final int FOLDED_VALUE = 1;

	/**
	 * The '<em><b>TRANSPOSED</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * One multiplier per coefficient, delays between the adders.
	 * <!-- end-model-doc -->
	 * @see #TRANSPOSED
	 * @model literal="transposed"
	 * @generated
	 * @ordered
	 */
	public static final int TRANSPOSED_VALUE = 2;

	/**
	 * The '<em><b>HALF BAND</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Like folded, but zero coefficients cost nothing; needs a half-band filter.
	 * <!-- end-model-doc -->
	 * @see #HALF_BAND
	 * @model literal="half-band"
	 * @generated
	 * @ordered
	 */
	public static final int HALF_BAND_VALUE = 3;

	/**
	 * The '<em><b>POLYPHASE DECIMATOR</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Computes only the samples that are kept.
	 * <!-- end-model-doc -->
	 * @see #POLYPHASE_DECIMATOR
	 * @model literal="polyphase-decimator"
	 * @generated
	 * @ordered
	 */
	public static final int POLYPHASE_DECIMATOR_VALUE = 4;

	/**
	 * The '<em><b>POLYPHASE INTERPOLATOR</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Leaves out the products with inserted zeros.
	 * <!-- end-model-doc -->
	 * @see #POLYPHASE_INTERPOLATOR
	 * @model literal="polyphase-interpolator"
	 * @generated
	 * @ordered
	 */
	public static final int POLYPHASE_INTERPOLATOR_VALUE = 5;

	/**
	 * An array of all the '<em><b>Structure</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final Structure[] VALUES_ARRAY =
		new Structure[] {
			DIRECT,
			FOLDED,
			TRANSPOSED,
			HALF_BAND,
			POLYPHASE_DECIMATOR,
			POLYPHASE_INTERPOLATOR,
		};

	/**
	 * A public read-only list of all the '<em><b>Structure</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<Structure> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Structure</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Structure get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			Structure result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Structure</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Structure getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			Structure result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Structure</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Structure get(int value) {
		switch (value) {
			case DIRECT_VALUE: return DIRECT;
			case FOLDED_VALUE: return FOLDED;
			case TRANSPOSED_VALUE: return TRANSPOSED;
			case HALF_BAND_VALUE: return HALF_BAND;
			case POLYPHASE_DECIMATOR_VALUE: return POLYPHASE_DECIMATOR;
			case POLYPHASE_INTERPOLATOR_VALUE: return POLYPHASE_INTERPOLATOR;
		}
		return null;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final int value;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String name;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private final String literal;

	/**
	 * Only this class can construct instances.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private Structure(int value, String name, String literal) {
		this.value = value;
		this.name = name;
		this.literal = literal;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public int getValue() {
	  return value;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getName() {
	  return name;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String getLiteral() {
	  return literal;
	}

	/**
	 * Returns the literal value of the enumerator, which is its string representation.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		return literal;
	}
	
} //Structure

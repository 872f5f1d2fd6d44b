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
 * A representation of the literals of the enumeration '<em><b>Pulse Gain</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * What a pulse is scaled to.
 * <!-- end-model-doc -->
 * @see tapwright.model.ModelPackage#getPulseGain()
 * @model
 * @generated
 */
public enum PulseGain implements Enumerator {
	/**
	 * The '<em><b>UNITY AT ZERO</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The coefficients add up to 1.
	 * <!-- end-model-doc -->
	 * @see #UNITY_AT_ZERO_VALUE
	 * @generated
	 * @ordered
	 */
	UNITY_AT_ZERO(0, "UNITY_AT_ZERO", "unity-at-zero"),

	/**
	 * The '<em><b>UNIT ENERGY</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The squares of the coefficients add up to 1.
	 * <!-- end-model-doc -->
	 * @see #UNIT_ENERGY_VALUE
	 * @generated
	 * @ordered
	 */
	UNIT_ENERGY(1, "UNIT_ENERGY", "unit-energy"),

	/**
	 * The '<em><b>CLOSED FORM</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The closed form for symbols of duration 1, unscaled.
	 * <!-- end-model-doc -->
	 * @see #CLOSED_FORM_VALUE
	 * @generated
	 * @ordered
	 */
	CLOSED_FORM(2, "CLOSED_FORM", "closed-form");

	/**
	 * The '<em><b>UNITY AT ZERO</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The coefficients add up to 1.
	 * <!-- end-model-doc -->
	 * @see #UNITY_AT_ZERO
	 * @model literal="unity-at-zero"
	 * @generated
	 * @ordered
	 */
	public static final int UNITY_AT_ZERO_VALUE = 0;

	/**
	 * The '<em><b>UNIT ENERGY</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The squares of the coefficients add up to 1.
	 * <!-- end-model-doc -->
	 * @see #UNIT_ENERGY
	 * @model literal="unit-energy"
	 * @generated
	 * @ordered
	 */
	public static final int UNIT_ENERGY_VALUE = 1;

	/**
	 * The '<em><b>CLOSED FORM</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The closed form for symbols of duration 1, unscaled.
	 * <!-- end-model-doc -->
	 * @see #CLOSED_FORM
	 * @model literal="closed-form"
	 * @generated
	 * @ordered
	 */
	public static final int CLOSED_FORM_VALUE = 2;

	/**
	 * An array of all the '<em><b>Pulse Gain</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final PulseGain[] VALUES_ARRAY =
		new PulseGain[] {
			UNITY_AT_ZERO,
			UNIT_ENERGY,
			CLOSED_FORM,
		};

	/**
	 * A public read-only list of all the '<em><b>Pulse Gain</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<PulseGain> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Pulse Gain</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static PulseGain get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			PulseGain result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Pulse Gain</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static PulseGain getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			PulseGain result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Pulse Gain</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static PulseGain get(int value) {
		switch (value) {
			case UNITY_AT_ZERO_VALUE: return UNITY_AT_ZERO;
			case UNIT_ENERGY_VALUE: return UNIT_ENERGY;
			case CLOSED_FORM_VALUE: return CLOSED_FORM;
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
	private PulseGain(int value, String name, String literal) {
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
	
} //PulseGain

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
 * A representation of the literals of the enumeration '<em><b>Input Class</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * The input signals that a guarantee speaks of.
 * <!-- end-model-doc -->
 * @see tapwright.model.ModelPackage#getInputClass()
 * @model
 * @generated
 */
public enum InputClass implements Enumerator {
	/**
	 * The '<em><b>FULL SCALE</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Any sequence of samples of the input format.
	 * <!-- end-model-doc -->
	 * @see #FULL_SCALE_VALUE
	 * @generated
	 * @ordered
	 */
	FULL_SCALE(0, "FULL_SCALE", "full-scale"),

	/**
	 * The '<em><b>SINUSOID</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Any sampled sinusoid whose amplitude fits the input format.
	 * <!-- end-model-doc -->
	 * @see #SINUSOID_VALUE
	 * @generated
	 * @ordered
	 */
	SINUSOID(1, "SINUSOID", "sinusoid");

	/**
	 * The '<em><b>FULL SCALE</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Any sequence of samples of the input format.
	 * <!-- end-model-doc -->
	 * @see #FULL_SCALE
	 * @model literal="full-scale"
	 * @generated
	 * @ordered
	 */
	public static final int FULL_SCALE_VALUE = 0;

	/**
	 * The '<em><b>SINUSOID</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Any sampled sinusoid whose amplitude fits the input format.
	 * <!-- end-model-doc -->
	 * @see #SINUSOID
	 * @model literal="sinusoid"
	 * @generated
	 * @ordered
	 */
	public static final int SINUSOID_VALUE = 1;

	/**
	 * An array of all the '<em><b>Input Class</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final InputClass[] VALUES_ARRAY =
		new InputClass[] {
			FULL_SCALE,
			SINUSOID,
		};

	/**
	 * A public read-only list of all the '<em><b>Input Class</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<InputClass> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Input Class</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static InputClass get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			InputClass result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Input Class</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static InputClass getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			InputClass result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Input Class</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static InputClass get(int value) {
		switch (value) {
			case FULL_SCALE_VALUE: return FULL_SCALE;
			case SINUSOID_VALUE: return SINUSOID;
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
	private InputClass(int value, String name, String literal) {
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
	
} //InputClass

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
 * A representation of the literals of the enumeration '<em><b>Rounding</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * How a number between two steps of a format is brought to one of them.
 * <!-- end-model-doc -->
 * @see tapwright.model.ModelPackage#getRounding()
 * @model
 * @generated
 */
public enum Rounding implements Enumerator {
	/**
	 * The '<em><b>TOWARD ZERO</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * To the step nearer to zero.
	 * <!-- end-model-doc -->
	 * @see #TOWARD_ZERO_VALUE
	 * @generated
	 * @ordered
	 */
	TOWARD_ZERO(0, "TOWARD_ZERO", "toward-zero"),

	/**
	 * The '<em><b>FLOOR</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * To the lower step.
	 * <!-- end-model-doc -->
	 * @see #FLOOR_VALUE
	 * @generated
	 * @ordered
	 */
	FLOOR(1, "FLOOR", "floor"),

	/**
	 * The '<em><b>HALF UP</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * To the nearest step, ties upward.
	 * <!-- end-model-doc -->
	 * @see #HALF_UP_VALUE
	 * @generated
	 * @ordered
	 */
	HALF_UP(2, "HALF_UP", "half-up"),

	/**
	 * The '<em><b>HALF EVEN</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * To the nearest step, ties to the even one.
	 * <!-- end-model-doc -->
	 * @see #HALF_EVEN_VALUE
	 * @generated
	 * @ordered
	 */
	HALF_EVEN(3, "HALF_EVEN", "half-even"),

	/**
	 * The '<em><b>HALF AWAY</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * To the nearest step, ties away from zero.
	 * <!-- end-model-doc -->
	 * @see #HALF_AWAY_VALUE
	 * @generated
	 * @ordered
	 */
	HALF_AWAY(4, "HALF_AWAY", "half-away");

	/**
	 * The '<em><b>TOWARD ZERO</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * To the step nearer to zero.
	 * <!-- end-model-doc -->
	 * @see #TOWARD_ZERO
	 * @model literal="toward-zero"
	 * @generated
	 * @ordered
	 */
	public static final int TOWARD_ZERO_VALUE = 0;

	/**
	 * The '<em><b>FLOOR</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * To the lower step.
	 * <!-- end-model-doc -->
	 * @see #FLOOR
	 * @model literal="floor"
	 * @generated
	 * @ordered
	 */
	public static final int FLOOR_VALUE = 1;

	/**
	 * The '<em><b>HALF UP</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * To the nearest step, ties upward.
	 * <!-- end-model-doc -->
	 * @see #HALF_UP
	 * @model literal="half-up"
	 * @generated
	 * @ordered
	 */
	public static final int HALF_UP_VALUE = 2;

	/**
	 * The '<em><b>HALF EVEN</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * To the nearest step, ties to the even one.
	 * <!-- end-model-doc -->
	 * @see #HALF_EVEN
	 * @model literal="half-even"
	 * @generated
	 * @ordered
	 */
	public static final int HALF_EVEN_VALUE = 3;

	/**
	 * The '<em><b>HALF AWAY</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * To the nearest step, ties away from zero.
	 * <!-- end-model-doc -->
	 * @see #HALF_AWAY
	 * @model literal="half-away"
	 * @generated
	 * @ordered
	 */
	public static final int HALF_AWAY_VALUE = 4;

	/**
	 * An array of all the '<em><b>Rounding</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final Rounding[] VALUES_ARRAY =
		new Rounding[] {
			TOWARD_ZERO,
			FLOOR,
			HALF_UP,
			HALF_EVEN,
			HALF_AWAY,
		};

	/**
	 * A public read-only list of all the '<em><b>Rounding</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<Rounding> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Rounding</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Rounding get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			Rounding result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Rounding</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Rounding getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			Rounding result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Rounding</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Rounding get(int value) {
		switch (value) {
			case TOWARD_ZERO_VALUE: return TOWARD_ZERO;
			case FLOOR_VALUE: return FLOOR;
			case HALF_UP_VALUE: return HALF_UP;
			case HALF_EVEN_VALUE: return HALF_EVEN;
			case HALF_AWAY_VALUE: return HALF_AWAY;
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
	private Rounding(int value, String name, String literal) {
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
	
} //Rounding

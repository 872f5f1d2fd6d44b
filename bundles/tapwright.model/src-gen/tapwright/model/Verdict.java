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
 * A representation of the literals of the enumeration '<em><b>Verdict</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * What a verification says of a requirement.
 * <!-- end-model-doc -->
 * @see tapwright.model.ModelPackage#getVerdict()
 * @model
 * @generated
 */
public enum Verdict implements Enumerator {
	/**
	 * The '<em><b>MET</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Proven to hold.
	 * <!-- end-model-doc -->
	 * @see #MET_VALUE
	 * @generated
	 * @ordered
	 */
	MET(0, "MET", "met"),

	/**
	 * The '<em><b>MISSED</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Proven not to hold.
	 * <!-- end-model-doc -->
	 * @see #MISSED_VALUE
	 * @generated
	 * @ordered
	 */
	MISSED(1, "MISSED", "missed"),

	/**
	 * The '<em><b>UNPROVEN</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Neither was proven.
	 * <!-- end-model-doc -->
	 * @see #UNPROVEN_VALUE
	 * @generated
	 * @ordered
	 */
	UNPROVEN(2, "UNPROVEN", "unproven");

	/**
	 * The '<em><b>MET</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Proven to hold.
	 * <!-- end-model-doc -->
	 * @see #MET
	 * @model literal="met"
	 * @generated
	 * @ordered
	 */
	public static final int MET_VALUE = 0;

	/**
	 * The '<em><b>MISSED</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Proven not to hold.
	 * <!-- end-model-doc -->
	 * @see #MISSED
	 * @model literal="missed"
	 * @generated
	 * @ordered
	 */
	public static final int MISSED_VALUE = 1;

	/**
	 * The '<em><b>UNPROVEN</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Neither was proven.
	 * <!-- end-model-doc -->
	 * @see #UNPROVEN
	 * @model literal="unproven"
	 * @generated
	 * @ordered
	 */
	public static final int UNPROVEN_VALUE = 2;

	/**
	 * An array of all the '<em><b>Verdict</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final Verdict[] VALUES_ARRAY =
		new Verdict[] {
			MET,
			MISSED,
			UNPROVEN,
		};

	/**
	 * A public read-only list of all the '<em><b>Verdict</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<Verdict> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Verdict</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Verdict get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			Verdict result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Verdict</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Verdict getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			Verdict result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Verdict</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static Verdict get(int value) {
		switch (value) {
			case MET_VALUE: return MET;
			case MISSED_VALUE: return MISSED;
			case UNPROVEN_VALUE: return UNPROVEN;
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
	private Verdict(int value, String name, String literal) {
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
	
} //Verdict

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
 * A representation of the literals of the enumeration '<em><b>Window Kind</b></em>',
 * and utility methods for working with them.
 * <!-- end-user-doc -->
 * <!-- begin-model-doc -->
 * A window function.
 * <!-- end-model-doc -->
 * @see tapwright.model.ModelPackage#getWindowKind()
 * @model
 * @generated
 */
public enum WindowKind implements Enumerator {
	/**
	 * The '<em><b>RECTANGULAR</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * All ones.
	 * <!-- end-model-doc -->
	 * @see #RECTANGULAR_VALUE
	 * @generated
	 * @ordered
	 */
	RECTANGULAR(0, "RECTANGULAR", "rectangular"),

	/**
	 * The '<em><b>BARTLETT</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Triangle with zero ends.
	 * <!-- end-model-doc -->
	 * @see #BARTLETT_VALUE
	 * @generated
	 * @ordered
	 */
	BARTLETT(1, "BARTLETT", "bartlett"),

	/**
	 * The '<em><b>HANN</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Raised cosine.
	 * <!-- end-model-doc -->
	 * @see #HANN_VALUE
	 * @generated
	 * @ordered
	 */
	HANN(2, "HANN", "hann"),

	/**
	 * The '<em><b>HAMMING</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * 0.54 and 0.46.
	 * <!-- end-model-doc -->
	 * @see #HAMMING_VALUE
	 * @generated
	 * @ordered
	 */
	HAMMING(3, "HAMMING", "hamming"),

	/**
	 * The '<em><b>HAMMING EXACT</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * 25/46 and 21/46.
	 * <!-- end-model-doc -->
	 * @see #HAMMING_EXACT_VALUE
	 * @generated
	 * @ordered
	 */
	HAMMING_EXACT(4, "HAMMING_EXACT", "hamming-exact"),

	/**
	 * The '<em><b>BLACKMAN</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * 0.42, 0.5 and 0.08.
	 * <!-- end-model-doc -->
	 * @see #BLACKMAN_VALUE
	 * @generated
	 * @ordered
	 */
	BLACKMAN(5, "BLACKMAN", "blackman"),

	/**
	 * The '<em><b>BLACKMAN EXACT</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * 7938/18608, 9240/18608 and 1430/18608.
	 * <!-- end-model-doc -->
	 * @see #BLACKMAN_EXACT_VALUE
	 * @generated
	 * @ordered
	 */
	BLACKMAN_EXACT(6, "BLACKMAN_EXACT", "blackman-exact"),

	/**
	 * The '<em><b>BLACKMAN HARRIS</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Four terms, -92 dB.
	 * <!-- end-model-doc -->
	 * @see #BLACKMAN_HARRIS_VALUE
	 * @generated
	 * @ordered
	 */
	BLACKMAN_HARRIS(7, "BLACKMAN_HARRIS", "blackman-harris"),

	/**
	 * The '<em><b>NUTTALL</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Four terms with continuous first derivative.
	 * <!-- end-model-doc -->
	 * @see #NUTTALL_VALUE
	 * @generated
	 * @ordered
	 */
	NUTTALL(8, "NUTTALL", "nuttall"),

	/**
	 * The '<em><b>FLAT TOP</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Five terms for amplitude measurement.
	 * <!-- end-model-doc -->
	 * @see #FLAT_TOP_VALUE
	 * @generated
	 * @ordered
	 */
	FLAT_TOP(9, "FLAT_TOP", "flat-top"),

	/**
	 * The '<em><b>GAUSSIAN</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Gaussian; the parameter is the standard deviation relative to half the length.
	 * <!-- end-model-doc -->
	 * @see #GAUSSIAN_VALUE
	 * @generated
	 * @ordered
	 */
	GAUSSIAN(10, "GAUSSIAN", "gaussian"),

	/**
	 * The '<em><b>TUKEY</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Flat middle with cosine ends; the parameter is the part of the length that is tapered.
	 * <!-- end-model-doc -->
	 * @see #TUKEY_VALUE
	 * @generated
	 * @ordered
	 */
	TUKEY(11, "TUKEY", "tukey"),

	/**
	 * The '<em><b>KAISER</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The parameter is beta.
	 * <!-- end-model-doc -->
	 * @see #KAISER_VALUE
	 * @generated
	 * @ordered
	 */
	KAISER(12, "KAISER", "kaiser"),

	/**
	 * The '<em><b>DOLPH CHEBYSHEV</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The parameter is the side-lobe level in dB, positive.
	 * <!-- end-model-doc -->
	 * @see #DOLPH_CHEBYSHEV_VALUE
	 * @generated
	 * @ordered
	 */
	DOLPH_CHEBYSHEV(13, "DOLPH_CHEBYSHEV", "dolph-chebyshev"),

	/**
	 * The '<em><b>DISCRETE PROLATE</b></em>' literal object.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The parameter is the time-half-bandwidth product.
	 * <!-- end-model-doc -->
	 * @see #DISCRETE_PROLATE_VALUE
	 * @generated
	 * @ordered
	 */
	DISCRETE_PROLATE(14, "DISCRETE_PROLATE", "discrete-prolate");

	/**
	 * The '<em><b>RECTANGULAR</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * All ones.
	 * <!-- end-model-doc -->
	 * @see #RECTANGULAR
	 * @model literal="rectangular"
	 * @generated
	 * @ordered
	 */
	public static final int RECTANGULAR_VALUE = 0;

	/**
	 * The '<em><b>BARTLETT</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Triangle with zero ends.
	 * <!-- end-model-doc -->
	 * @see #BARTLETT
	 * @model literal="bartlett"
	 * @generated
	 * @ordered
	 */
	public static final int BARTLETT_VALUE = 1;

	/**
	 * The '<em><b>HANN</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Raised cosine.
	 * <!-- end-model-doc -->
	 * @see #HANN
	 * @model literal="hann"
	 * @generated
	 * @ordered
	 */
	public static final int HANN_VALUE = 2;

	/**
	 * The '<em><b>HAMMING</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * 0.54 and 0.46.
	 * <!-- end-model-doc -->
	 * @see #HAMMING
	 * @model literal="hamming"
	 * @generated
	 * @ordered
	 */
	public static final int HAMMING_VALUE = 3;

	/**
	 * The '<em><b>HAMMING EXACT</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * 25/46 and 21/46.
	 * <!-- end-model-doc -->
	 * @see #HAMMING_EXACT
	 * @model literal="hamming-exact"
	 * @generated
	 * @ordered
	 */
	public static final int HAMMING_EXACT_VALUE = 4;

	/**
	 * The '<em><b>BLACKMAN</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * 0.42, 0.5 and 0.08.
	 * <!-- end-model-doc -->
	 * @see #BLACKMAN
	 * @model literal="blackman"
	 * @generated
	 * @ordered
	 */
	public static final int BLACKMAN_VALUE = 5;

	/**
	 * The '<em><b>BLACKMAN EXACT</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * 7938/18608, 9240/18608 and 1430/18608.
	 * <!-- end-model-doc -->
	 * @see #BLACKMAN_EXACT
	 * @model literal="blackman-exact"
	 * @generated
	 * @ordered
	 */
	public static final int BLACKMAN_EXACT_VALUE = 6;

	/**
	 * The '<em><b>BLACKMAN HARRIS</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Four terms, -92 dB.
	 * <!-- end-model-doc -->
	 * @see #BLACKMAN_HARRIS
	 * @model literal="blackman-harris"
	 * @generated
	 * @ordered
	 */
	public static final int BLACKMAN_HARRIS_VALUE = 7;

	/**
	 * The '<em><b>NUTTALL</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Four terms with continuous first derivative.
	 * <!-- end-model-doc -->
	 * @see #NUTTALL
	 * @model literal="nuttall"
	 * @generated
	 * @ordered
	 */
	public static final int NUTTALL_VALUE = 8;

	/**
	 * The '<em><b>FLAT TOP</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Five terms for amplitude measurement.
	 * <!-- end-model-doc -->
	 * @see #FLAT_TOP
	 * @model literal="flat-top"
	 * @generated
	 * @ordered
	 */
	public static final int FLAT_TOP_VALUE = 9;

	/**
	 * The '<em><b>GAUSSIAN</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Gaussian; the parameter is the standard deviation relative to half the length.
	 * <!-- end-model-doc -->
	 * @see #GAUSSIAN
	 * @model literal="gaussian"
	 * @generated
	 * @ordered
	 */
	public static final int GAUSSIAN_VALUE = 10;

	/**
	 * The '<em><b>TUKEY</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * Flat middle with cosine ends; the parameter is the part of the length that is tapered.
	 * <!-- end-model-doc -->
	 * @see #TUKEY
	 * @model literal="tukey"
	 * @generated
	 * @ordered
	 */
	public static final int TUKEY_VALUE = 11;

	/**
	 * The '<em><b>KAISER</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The parameter is beta.
	 * <!-- end-model-doc -->
	 * @see #KAISER
	 * @model literal="kaiser"
	 * @generated
	 * @ordered
	 */
	public static final int KAISER_VALUE = 12;

	/**
	 * The '<em><b>DOLPH CHEBYSHEV</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The parameter is the side-lobe level in dB, positive.
	 * <!-- end-model-doc -->
	 * @see #DOLPH_CHEBYSHEV
	 * @model literal="dolph-chebyshev"
	 * @generated
	 * @ordered
	 */
	public static final int DOLPH_CHEBYSHEV_VALUE = 13;

	/**
	 * The '<em><b>DISCRETE PROLATE</b></em>' literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * <!-- begin-model-doc -->
	 * The parameter is the time-half-bandwidth product.
	 * <!-- end-model-doc -->
	 * @see #DISCRETE_PROLATE
	 * @model literal="discrete-prolate"
	 * @generated
	 * @ordered
	 */
	public static final int DISCRETE_PROLATE_VALUE = 14;

	/**
	 * An array of all the '<em><b>Window Kind</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	private static final WindowKind[] VALUES_ARRAY =
		new WindowKind[] {
			RECTANGULAR,
			BARTLETT,
			HANN,
			HAMMING,
			HAMMING_EXACT,
			BLACKMAN,
			BLACKMAN_EXACT,
			BLACKMAN_HARRIS,
			NUTTALL,
			FLAT_TOP,
			GAUSSIAN,
			TUKEY,
			KAISER,
			DOLPH_CHEBYSHEV,
			DISCRETE_PROLATE,
		};

	/**
	 * A public read-only list of all the '<em><b>Window Kind</b></em>' enumerators.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	public static final List<WindowKind> VALUES = Collections.unmodifiableList(Arrays.asList(VALUES_ARRAY));

	/**
	 * Returns the '<em><b>Window Kind</b></em>' literal with the specified literal value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param literal the literal.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static WindowKind get(String literal) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			WindowKind result = VALUES_ARRAY[i];
			if (result.toString().equals(literal)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Window Kind</b></em>' literal with the specified name.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param name the name.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static WindowKind getByName(String name) {
		for (int i = 0; i < VALUES_ARRAY.length; ++i) {
			WindowKind result = VALUES_ARRAY[i];
			if (result.getName().equals(name)) {
				return result;
			}
		}
		return null;
	}

	/**
	 * Returns the '<em><b>Window Kind</b></em>' literal with the specified integer value.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @param value the integer value.
	 * @return the matching enumerator or <code>null</code>.
	 * @generated
	 */
	public static WindowKind get(int value) {
		switch (value) {
			case RECTANGULAR_VALUE: return RECTANGULAR;
			case BARTLETT_VALUE: return BARTLETT;
			case HANN_VALUE: return HANN;
			case HAMMING_VALUE: return HAMMING;
			case HAMMING_EXACT_VALUE: return HAMMING_EXACT;
			case BLACKMAN_VALUE: return BLACKMAN;
			case BLACKMAN_EXACT_VALUE: return BLACKMAN_EXACT;
			case BLACKMAN_HARRIS_VALUE: return BLACKMAN_HARRIS;
			case NUTTALL_VALUE: return NUTTALL;
			case FLAT_TOP_VALUE: return FLAT_TOP;
			case GAUSSIAN_VALUE: return GAUSSIAN;
			case TUKEY_VALUE: return TUKEY;
			case KAISER_VALUE: return KAISER;
			case DOLPH_CHEBYSHEV_VALUE: return DOLPH_CHEBYSHEV;
			case DISCRETE_PROLATE_VALUE: return DISCRETE_PROLATE;
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
	private WindowKind(int value, String name, String literal) {
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
	
} //WindowKind

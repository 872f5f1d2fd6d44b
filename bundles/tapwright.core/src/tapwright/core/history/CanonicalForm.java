// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.io.ByteArrayOutputStream;
import java.math.BigInteger;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Comparator;
import java.util.HexFormat;
import java.util.List;
import java.util.Set;
import java.util.function.Predicate;

import org.eclipse.emf.common.util.Enumerator;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EStructuralFeature;

/**
 * The bytes that the hash of a revision is taken over. They depend on the content alone: not on the layout or line ends of the
 * file, the order of attributes, the platform or the locale.
 * <p>
 * The form, with LF for the byte 0A and SP for the byte 20; everything outside of strings is ASCII, decimal numbers have no sign
 * unless negative and no leading zero:
 *
 * <pre>
 * form    = "tapwright-canonical/1" LF object
 * object  = "(" CLASS LF { feature } ")" LF
 * feature = NAME SP COUNT LF value { value }
 * value   = object
 *         | "s" SP LENGTH SP BYTES LF      text: LENGTH bytes of UTF-8, written as they are
 *         | "i" SP DECIMAL LF              whole number
 *         | "d" SP 16 HEXDIGITS LF         binary64: its bits, most significant first, lower case; every NaN is 7ff8000000000000
 *         | "b" SP ( "true" | "false" ) LF
 *         | "e" SP LITERAL LF              choice: its name in files
 * </pre>
 *
 * CLASS and NAME are the names in the model. Features stand in the order of their names by ASCII code. A feature that has its
 * default value, and an empty list, is left out, so that a feature that is added to the model later leaves the hashes of older
 * revisions as they are; the defaults themselves never change. COUNT is the number of values: 1 for a feature with a single
 * value. Values of a list stand in their order. Stateless.
 */
public final class CanonicalForm {

	private static final String HEADER = "tapwright-canonical/1\n";
	private static final long NOT_A_NUMBER = 0x7ff8000000000000L;

	private final ByteArrayOutputStream bytes = new ByteArrayOutputStream();

	private CanonicalForm() {
	}

	/**
	 * The form of an object and all that it contains.
	 *
	 * @throws IllegalArgumentException
	 *             when a text holds half of a surrogate pair, which has no UTF-8
	 */
	public static byte[] of(EObject root) {
		return of(root, feature -> true);
	}

	private static byte[] of(EObject root, Predicate<EStructuralFeature> included) {
		var form = new CanonicalForm();
		form.ascii(HEADER);
		form.object(root, included);
		return form.bytes.toByteArray();
	}

	/** SHA-256 of the form, 64 hexadecimal digits in lower case. */
	public static String hash(EObject root) {
		return digest(of(root));
	}

	/** The hash of an object as if it had only the given features, and these in full. */
	static String hash(EObject root, Set<? extends EStructuralFeature> features) {
		return digest(of(root, features::contains));
	}

	private static String digest(byte[] form) {
		try {
			return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(form));
		} catch (NoSuchAlgorithmException e) {
			throw new IllegalStateException("every Java platform has SHA-256", e);
		}
	}

	private void object(EObject object, Predicate<EStructuralFeature> included) {
		ascii("(" + object.eClass().getName() + "\n");
		List<EStructuralFeature> features = object.eClass().getEAllStructuralFeatures().stream()
				.filter(feature -> !feature.isTransient() && included.test(feature) && object.eIsSet(feature))
				.sorted(Comparator.comparing(EStructuralFeature::getName)).toList();
		for (EStructuralFeature feature : features) {
			List<?> values = feature.isMany() ? (List<?>) object.eGet(feature) : List.of(object.eGet(feature));
			ascii(feature.getName() + " " + values.size() + "\n");
			values.forEach(this::value);
		}
		ascii(")\n");
	}

	private void value(Object value) {
		switch (value) {
		case EObject object -> object(object, feature -> true);
		case String text -> text(text);
		case Integer number -> ascii("i " + number + "\n");
		case BigInteger number -> ascii("i " + number + "\n");
		case Double number -> ascii("d " + HexFormat.of()
				.toHexDigits(number.isNaN() ? NOT_A_NUMBER : Double.doubleToRawLongBits(number)) + "\n");
		case Boolean flag -> ascii("b " + flag + "\n");
		case Enumerator choice -> ascii("e " + choice.getLiteral() + "\n");
		default -> throw new IllegalStateException("the canonical form has no " + value.getClass().getName());
		}
	}

	private void text(String text) {
		try {
			ByteBuffer encoded = StandardCharsets.UTF_8.newEncoder().encode(CharBuffer.wrap(text));
			ascii("s " + encoded.remaining() + " ");
			bytes.write(encoded.array(), encoded.arrayOffset() + encoded.position(), encoded.remaining());
			ascii("\n");
		} catch (CharacterCodingException e) {
			throw new IllegalArgumentException("the text '" + text + "' holds half of a character; correct it", e);
		}
	}

	private void ascii(String text) {
		bytes.writeBytes(text.getBytes(StandardCharsets.US_ASCII));
	}
}

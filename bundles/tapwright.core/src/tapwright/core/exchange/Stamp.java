// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Two hashes inside every exported text: of the numbers of the filter, and of the text itself with this hash's digits set to
 * zero. The first tells whether the filter has changed since, the second whether the text has. Line ends do not count, since
 * version control may change them.
 */
public final class Stamp {

	private static final String ZEROS = "0".repeat(64);
	private static final Pattern NUMBERS = Pattern.compile("tapwright-numbers\"?: ?\"?([0-9a-f]{64})");
	private static final Pattern TEXT = Pattern.compile("(tapwright-text\"?: ?\"?)([0-9a-f]{64})");

	private Stamp() {
	}

	/** What a text must hold once in place of its own hash before it is sealed. */
	public static String placeholder() {
		return ZEROS;
	}

	/** Puts the hash of the text into it. */
	public static String seal(String text) {
		Matcher matcher = TEXT.matcher(text);
		if (!matcher.find()) {
			throw new IllegalArgumentException("the text has no place for its hash");
		}
		return text.substring(0, matcher.start(2)) + textHash(text) + text.substring(matcher.end(2));
	}

	/** The hash of the filter's numbers that a text carries. */
	public static Optional<String> numbers(String text) {
		Matcher matcher = NUMBERS.matcher(text);
		return matcher.find() ? Optional.of(matcher.group(1)) : Optional.empty();
	}

	/** Whether the text is as it was sealed; nothing when it carries no seal. */
	public static Optional<Boolean> intact(String text) {
		Matcher matcher = TEXT.matcher(text);
		return matcher.find() ? Optional.of(matcher.group(2).equals(textHash(text))) : Optional.empty();
	}

	private static String textHash(String text) {
		Matcher matcher = TEXT.matcher(text);
		String blank = matcher.find() ? text.substring(0, matcher.start(2)) + ZEROS + text.substring(matcher.end(2))
				: text;
		return sha256(blank.replace("\r\n", "\n").getBytes(StandardCharsets.UTF_8));
	}

	static String sha256(byte[] content) {
		try {
			return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(content));
		} catch (NoSuchAlgorithmException e) {
			throw new IllegalStateException("every Java platform has SHA-256", e);
		}
	}
}

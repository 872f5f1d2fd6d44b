// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.imports;

import java.io.ByteArrayOutputStream;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import tapwright.core.InputException;
import tapwright.dsp.arithmetic.NumberFormat;

/**
 * Memory images as text: words in hexadecimal digits as simulators read them (IEEE Std 1800-2017, clause 21.4), or records that
 * begin with ':' with length, address, type and check sum (common practice, no source).
 */
final class HexReader {

	private static final Pattern WORD = Pattern.compile("\\S+");
	private static final Pattern BITS = Pattern.compile("(?m)^// .* words of (\\d{1,3}) bits");
	private static final int DATA = 0;
	private static final int END = 1;
	private static final int FEWEST_BYTES = 5;

	private HexReader() {
	}

	static List<ImportedTable> read(Places source, ImportOptions options) throws InputException {
		if (source.text().stripLeading().startsWith(":")) {
			return BinaryReader.read(source.file(), records(source), options);
		}
		return words(source, options);
	}

	private static List<ImportedTable> words(Places source, ImportOptions options) throws InputException {
		String text = source.text();
		var digits = new ArrayList<String>();
		int first = -1;
		int from = 0;
		for (String line : text.split("\n", -1)) {
			int comment = Math.min(index(line, "//"), index(line, "#"));
			Matcher matcher = WORD.matcher(line.substring(0, comment));
			while (matcher.find()) {
				String word = matcher.group().replace("_", "");
				String plain = word.startsWith("0x") || word.startsWith("0X") ? word.substring(2) : word;
				if (word.startsWith("@") && word.matches("@[0-9A-Fa-f]{1,16}")) {
					if (!digits.isEmpty()) {
						throw source.error(from + matcher.start(),
								"the image has a gap; split it into one file for each filter");
					}
					continue;
				}
				if (!plain.matches("[0-9A-Fa-f]{1,32}")) {
					throw source.error(from + matcher.start(), Places.quote(matcher.group())
							+ " is not a word of up to 32 hexadecimal digits");
				}
				first = first < 0 ? from + matcher.start() : first;
				digits.add(plain);
			}
			from += line.length() + 1;
		}
		if (digits.isEmpty()) {
			return List.of();
		}
		int longest = digits.stream().mapToInt(String::length).max().orElseThrow();
		int bits = options.word().orElse(stated(text).orElse(4 * longest));
		List<BigInteger> words = digits.stream().map(word -> new BigInteger(word, 16)).toList();
		if (words.stream().anyMatch(word -> word.bitLength() > bits)) {
			throw source.error(first, "there are words of more than " + bits + " bits");
		}
		int fraction = TextReader.step(text).orElse(0);
		var format = new NumberFormat(bits, fraction, options.signed());
		return List.of(ImportedTable.whole("", source.line(first), words, Optional.of(format)));
	}

	private static Optional<Integer> stated(String text) {
		Matcher matcher = BITS.matcher(text);
		return matcher.find() && Integer.parseInt(matcher.group(1)) >= 1
				&& Integer.parseInt(matcher.group(1)) <= NumberFormat.MAX_WORD
				? Optional.of(Integer.parseInt(matcher.group(1))) : Optional.empty();
	}

	private static int index(String line, String sign) {
		int at = line.indexOf(sign);
		return at < 0 ? line.length() : at;
	}

	private static byte[] records(Places source) throws InputException {
		var bytes = new ByteArrayOutputStream();
		int from = 0;
		long next = -1;
		for (String line : source.text().split("\n", -1)) {
			String record = line.strip();
			int at = from + line.indexOf(record);
			from += line.length() + 1;
			if (record.isEmpty()) {
				continue;
			}
			byte[] content = record(source, record, at);
			int type = content[3];
			if (type == END) {
				return bytes.toByteArray();
			}
			if (type == DATA) {
				int address = (content[1] & 0xff) << 8 | content[2] & 0xff;
				if (next >= 0 && address != (next & 0xffff)) {
					throw source.error(at, "the image has a gap before this record; split it into one file for each filter");
				}
				next = address + (content[0] & 0xff);
				bytes.write(content, FEWEST_BYTES - 1, content.length - FEWEST_BYTES);
			}
		}
		throw source.error(source.text().length(), "the record that ends the image is missing");
	}

	private static byte[] record(Places source, String record, int at) throws InputException {
		if (!record.matches(":([0-9A-Fa-f]{2}){5,260}")) {
			throw source.error(at, "is no record of ':' and pairs of hexadecimal digits");
		}
		byte[] content = HexFormat.of().parseHex(record.substring(1));
		if (content.length != (content[0] & 0xff) + FEWEST_BYTES) {
			throw source.error(at, "the record says it has " + (content[0] & 0xff) + " bytes, but "
					+ (content.length - FEWEST_BYTES) + " follow");
		}
		int sum = 0;
		for (byte value : content) {
			sum += value;
		}
		if ((sum & 0xff) != 0) {
			throw source.error(at, "the check sum of the record is wrong");
		}
		return content;
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.util.List;
import java.util.stream.IntStream;

import tapwright.core.InputException;

/**
 * One of several equal parts of the work.
 *
 * @param index
 *            from 1
 * @param count
 *            number of parts
 */
record Shard(int index, int count) {

	static Shard parse(String text) throws InputException {
		if (text.matches("\\d{1,6}/\\d{1,6}")) {
			int slash = text.indexOf('/');
			var shard = new Shard(Integer.parseInt(text.substring(0, slash)), Integer.parseInt(text.substring(slash + 1)));
			if (shard.index >= 1 && shard.index <= shard.count) {
				return shard;
			}
		}
		throw new InputException("--shard", "'" + text + "' must be I/N with I from 1 to N, such as 2/8");
	}

	/** Every count-th element, so that each part has its share of every kind of work. */
	<T> List<T> of(List<T> all) {
		return IntStream.range(0, all.size()).filter(k -> k % count == index - 1).mapToObj(all::get).toList();
	}
}

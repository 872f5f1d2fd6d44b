// SPDX-License-Identifier: EPL-2.0
package tapwright.core.problem;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.Function;

/** Finds filters that share a name or an identity. Both must be unique in a portfolio: others refer to filters by them. */
public final class Duplicates {

	/**
	 * How a filter file calls itself.
	 *
	 * @param file
	 *            path in the portfolio
	 * @param name
	 *            of the filter
	 * @param identity
	 *            of the filter; empty when it has none
	 */
	public record Claim(String file, String name, String identity) {
	}

	private Duplicates() {
	}

	/** The problems by file; nothing for files that share nothing. */
	public static Map<String, List<Problem>> among(Collection<Claim> claims) {
		var problems = new TreeMap<String, List<Problem>>();
		find(claims, "identity", Claim::identity, problems);
		find(claims, "name", Claim::name, problems);
		return problems;
	}

	private static void find(Collection<Claim> claims, String what, Function<Claim, String> key, Map<String, List<Problem>> problems) {
		var byKey = new TreeMap<String, List<Claim>>();
		for (Claim claim : claims) {
			if (!key.apply(claim).isEmpty()) {
				byKey.computeIfAbsent(key.apply(claim), unused -> new ArrayList<>()).add(claim);
			}
		}
		for (List<Claim> same : byKey.values()) {
			for (Claim claim : same) {
				List<String> others = same.stream().filter(other -> other != claim).map(Claim::file).sorted().toList();
				if (!others.isEmpty()) {
					problems.computeIfAbsent(claim.file(), unused -> new ArrayList<>())
							.add(Problems.duplicate(claim.name(), what, others));
				}
			}
		}
	}
}

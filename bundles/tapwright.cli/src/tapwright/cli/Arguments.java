// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

import tapwright.cli.Verb.Option;
import tapwright.core.InputException;

/**
 * The arguments of a verb, sorted out.
 *
 * @param operands
 *            what is no option, in order
 * @param options
 *            values by name; empty for options without a value
 */
record Arguments(List<String> operands, Map<String, String> options) {

	/**
	 * Understands '--name value', '--name=value' and '--name'; after '--' everything is an operand.
	 *
	 * @throws InputException
	 *             on an unknown option, a missing value or a repeated option
	 */
	static Arguments parse(List<String> args, List<Option> known) throws InputException {
		var operands = new ArrayList<String>();
		var options = new HashMap<String, String>();
		for (int k = 0; k < args.size(); k++) {
			String argument = args.get(k);
			if (argument.equals("--")) {
				operands.addAll(args.subList(k + 1, args.size()));
				break;
			}
			if (!argument.startsWith("-") || argument.equals("-")) {
				operands.add(argument);
				continue;
			}
			int equals = argument.indexOf('=');
			String name = equals < 0 ? argument : argument.substring(0, equals);
			Option option = known.stream().filter(candidate -> candidate.name().equals(name)).findFirst()
					.orElseThrow(() -> new InputException(name, "there is no such option" + (known.isEmpty() ? ""
							: "; known are " + known.stream().map(Option::name).collect(Collectors.joining(", ")))));
			String value = "";
			if (option.hasValue()) {
				if (equals < 0 && ++k == args.size()) {
					throw new InputException(name, "needs a value");
				}
				value = equals < 0 ? args.get(k) : argument.substring(equals + 1);
			} else if (equals >= 0) {
				throw new InputException(name, "takes no value");
			}
			if (options.put(name, value) != null) {
				throw new InputException(name, "stands twice");
			}
		}
		return new Arguments(operands, options);
	}

	Optional<String> option(String name) {
		return Optional.ofNullable(options.get(name));
	}

	boolean has(String name) {
		return options.containsKey(name);
	}
}

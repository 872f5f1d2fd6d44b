// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

import java.util.List;
import java.util.Optional;

import tapwright.core.InputException;
import tapwright.core.exchange.HandOver;

/** One way to hand over coefficients. Stateless; the same filter gives the same text. */
public interface ExportFormat {

	/** What a person types to choose it. */
	String name();

	/** What it is, for a list of choices. */
	String label();

	/**
	 * The files for one filter.
	 *
	 * @throws InputException
	 *             when the format cannot hold the filter; says why
	 */
	List<ExportedFile> write(HandOver filter) throws InputException;

	/** All formats. */
	static List<ExportFormat> all() {
		return List.of(
				new CTable(), new CRoutine(), new TableText("csv", "comma-separated values", ".csv"), new JsonExport(),
				new WordTable("hex", "hexadecimal memory image", ".hex", "hex"),
				new WordTable("vhdl", "VHDL-2008 package", "_coefficients.vhd", "vhdl"),
				new WordTable("systemverilog", "SystemVerilog package", "_coefficients.sv", "systemverilog"));
	}

	/** The format of a name. */
	static Optional<ExportFormat> of(String name) {
		return all().stream().filter(format -> format.name().equals(name)).findFirst();
	}
}

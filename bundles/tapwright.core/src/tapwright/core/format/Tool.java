// SPDX-License-Identifier: EPL-2.0
package tapwright.core.format;

/** Name and version of the program, for results that are kept. */
public final class Tool {

	/** As in the manifests of the bundles. */
	public static final String VERSION = "0.1.0";
	/** Name and version. */
	public static final String NAME = "Tapwright " + VERSION;

	private Tool() {
	}
}

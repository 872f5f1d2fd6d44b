// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.export;

/**
 * A text to be written.
 *
 * @param name
 *            of the file, without folder
 * @param text
 *            its content; '\n' between lines
 */
public record ExportedFile(String name, String text) {
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.charts;

/**
 * A place that a person should look at.
 *
 * @param x
 *            the place
 * @param y
 *            the value there
 * @param label
 *            a few words
 * @param grave
 *            whether something is wrong there
 */
public record Mark(double x, double y, String label, boolean grave) {
}

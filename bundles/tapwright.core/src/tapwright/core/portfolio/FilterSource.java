// SPDX-License-Identifier: EPL-2.0
package tapwright.core.portfolio;

import java.nio.file.Path;
import java.util.Optional;

import tapwright.core.quantity.Parameters;
import tapwright.core.verify.Partners;
import tapwright.model.Filter;

/**
 * One filter file, read or not. Confined to the thread that reads it, like the model object that it holds.
 *
 * @param file
 *            where it is
 * @param filter
 *            its content; nothing when it cannot be read
 * @param parameters
 *            of the portfolio that it belongs to
 * @param partners
 *            the other filters of that portfolio
 * @param problem
 *            why it cannot be read, with the place; empty when it can
 */
public record FilterSource(Path file, Optional<Filter> filter, Parameters parameters, Partners partners, String problem) {
}

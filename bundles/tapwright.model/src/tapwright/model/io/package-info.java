// SPDX-License-Identifier: EPL-2.0
/**
 * Model objects as files: one root object a file, XMI in UTF-8 with one attribute or value per line, the same bytes for the same
 * content. Nothing that a file holds is dropped in silence: what the model does not know is an error with its line.
 */
package tapwright.model.io;

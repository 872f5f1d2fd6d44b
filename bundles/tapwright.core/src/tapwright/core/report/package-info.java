// SPDX-License-Identifier: EPL-2.0
/**
 * Reports for reviews: a folder of HTML pages that need neither a network nor a script to be read, and a summary in Markdown.
 * The same portfolio gives the same bytes.
 */
package tapwright.core.report;

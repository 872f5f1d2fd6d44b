// SPDX-License-Identifier: EPL-2.0
/**
 * What a person has to attend to in a portfolio: evidence, unreadable files and contradictions as a list of problems. The workspace
 * shows them as markers; nothing here knows of that.
 */
package tapwright.core.problem;

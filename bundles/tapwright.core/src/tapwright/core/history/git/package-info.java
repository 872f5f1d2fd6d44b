// SPDX-License-Identifier: EPL-2.0
/** What git knows of the files of a portfolio: authors, commits, earlier states. Only read, never written; nothing here needs git. */
package tapwright.core.history.git;

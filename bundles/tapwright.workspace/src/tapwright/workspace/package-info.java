// SPDX-License-Identifier: EPL-2.0

/** The workspace's view of portfolios: project nature, incremental builder and problem markers. */
package tapwright.workspace;

// SPDX-License-Identifier: EPL-2.0
/** The builder and what it keeps for each project. */
package tapwright.workspace.internal;

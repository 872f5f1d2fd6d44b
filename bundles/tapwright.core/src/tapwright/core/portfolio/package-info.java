// SPDX-License-Identifier: EPL-2.0
/** Portfolios as folders: the root file, the filters below it, and what cannot be read. */
package tapwright.core.portfolio;

// SPDX-License-Identifier: EPL-2.0

/** The stand-alone product: application, first window and perspective. */
package tapwright.app;

// SPDX-License-Identifier: EPL-2.0

/** Fixtures that several test bundles share. */
package tapwright.testing;

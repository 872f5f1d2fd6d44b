// SPDX-License-Identifier: EPL-2.0

/** What the bundles may use of each other, and what every file of the checkout must keep to. */
package tapwright.core.architecture;

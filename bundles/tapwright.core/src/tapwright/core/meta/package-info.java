// SPDX-License-Identifier: EPL-2.0
/** What the model says of itself: names of kinds and methods, units and documentation of features. */
package tapwright.core.meta;

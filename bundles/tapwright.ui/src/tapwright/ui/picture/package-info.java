// SPDX-License-Identifier: EPL-2.0
/** Pictures of filters: from numbers and statements to plots, computed in the background. */
package tapwright.ui.picture;

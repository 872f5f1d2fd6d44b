// SPDX-License-Identifier: EPL-2.0
/** What differs between two states of a filter, or three: in words, in numbers, and in what is proven. Knows no file and no window. */
package tapwright.core.compare;

// SPDX-License-Identifier: EPL-2.0
/** From the requirements and the design of a filter to its coefficients: translates model objects to the methods of the numerics. */
package tapwright.core.design;

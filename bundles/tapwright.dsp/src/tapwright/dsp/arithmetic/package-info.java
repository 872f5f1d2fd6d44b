// SPDX-License-Identifier: EPL-2.0
/** The numbers that ship: formats, structures, bit-true simulation and what can be guaranteed of them. */
package tapwright.dsp.arithmetic;

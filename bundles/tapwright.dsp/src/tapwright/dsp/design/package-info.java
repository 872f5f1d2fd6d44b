// SPDX-License-Identifier: EPL-2.0
/** Design methods: from a target to coefficients. Each is an immutable record of its parameters that computes on request. */
package tapwright.dsp.design;

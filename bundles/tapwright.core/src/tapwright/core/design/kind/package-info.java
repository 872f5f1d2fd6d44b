// SPDX-License-Identifier: EPL-2.0
/** The design methods: one small class each, from a model class to the method of the numerics. */
package tapwright.core.design.kind;

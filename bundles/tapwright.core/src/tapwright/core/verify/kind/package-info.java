// SPDX-License-Identifier: EPL-2.0
/** The requirement kinds: one small class each, from a model class to its proof and its words. */
package tapwright.core.verify.kind;

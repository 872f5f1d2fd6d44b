// SPDX-License-Identifier: EPL-2.0
/**
 * Masks of published standards, scaled to a sample rate and turned into requirements. Each names its standard, clause and edition, and
 * says how its numbers came here. Conformity is decided by the standard's own tests, never by a mask.
 */
package tapwright.core.mask;

// SPDX-License-Identifier: EPL-2.0
/** Numbers as people write them: with units, and as plain arithmetic over named parameters. Evaluated exactly, rounded once. */
package tapwright.core.quantity;

// SPDX-License-Identifier: EPL-2.0
/** What would meet a missed requirement: computed and proven, never guessed, and ready to be applied. */
package tapwright.core.remedy;

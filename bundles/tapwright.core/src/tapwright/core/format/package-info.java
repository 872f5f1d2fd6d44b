// SPDX-License-Identifier: EPL-2.0
/** Results of verification as files for people and for build servers. */
package tapwright.core.format;

// SPDX-License-Identifier: EPL-2.0
/** What all packages of the numerics share. Plain Java: nothing here knows of files, models or windows. */
package tapwright.dsp;

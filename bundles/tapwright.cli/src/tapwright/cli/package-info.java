// SPDX-License-Identifier: EPL-2.0

/** The headless command: verbs over files, exit codes, no window and no workspace. */
package tapwright.cli;

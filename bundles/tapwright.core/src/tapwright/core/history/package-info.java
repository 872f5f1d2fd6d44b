// SPDX-License-Identifier: EPL-2.0
/**
 * The design history of a portfolio as files that are added and never changed: revisions, baselines, sign-offs. Names follow from
 * content, so that two people can add files on two branches and merge them without conflict; every read checks the content.
 */
package tapwright.core.history;

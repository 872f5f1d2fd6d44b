// SPDX-License-Identifier: EPL-2.0
/**
 * Verification of filters: model objects become questions, questions become evidence. A question is immutable and can be answered
 * on any thread; the window, the builder and the command line ask the same questions and get the same bits.
 */
package tapwright.core.verify;

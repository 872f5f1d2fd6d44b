// SPDX-License-Identifier: EPL-2.0
/** Signals in files, read and written as a stream of any length, and filters that run over them. */
package tapwright.core.exchange.signal;

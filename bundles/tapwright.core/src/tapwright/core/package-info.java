// SPDX-License-Identifier: EPL-2.0
/** What all services share. The services compute from model objects to immutable results; they open no windows and own no threads. */
package tapwright.core;

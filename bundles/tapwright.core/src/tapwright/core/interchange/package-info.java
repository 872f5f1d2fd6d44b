// SPDX-License-Identifier: EPL-2.0
/**
 * The interchange format tapwright-filter/1: one filter as JSON. Keys are the features of the model, so that a new requirement kind
 * or design method needs nothing here; what is not known is an error with a pointer (RFC 6901) to the place.
 */
package tapwright.core.interchange;

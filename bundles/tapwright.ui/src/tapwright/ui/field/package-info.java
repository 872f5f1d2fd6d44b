// SPDX-License-Identifier: EPL-2.0
/** Fields for features of model objects: built from the model's own documentation and units, checked while typing. */
package tapwright.ui.field;

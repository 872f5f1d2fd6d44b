// SPDX-License-Identifier: EPL-2.0
/** What filters ask of the processors that they are deployed on, against what the processors have. */
package tapwright.core.load;

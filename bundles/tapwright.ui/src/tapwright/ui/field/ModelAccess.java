// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.field;

import org.eclipse.emf.edit.domain.EditingDomain;

import tapwright.core.quantity.Expression;

/** What fields need of the editor they stand in. UI thread. */
public interface ModelAccess {

	/** Where commands are made and executed. */
	EditingDomain domain();

	/** The parameters that numbers may use. */
	Expression.Names parameters();
}

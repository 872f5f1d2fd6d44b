// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.explorer;

import org.eclipse.jface.viewers.LabelProvider;
import org.eclipse.swt.graphics.Image;

import tapwright.ui.look.Verdicts;

/** Icon and words of a requirement in a tree. */
public final class RequirementLabels extends LabelProvider {

	@Override
	public String getText(Object element) {
		return element instanceof RequirementNode node ? node.evidence().id() + ": " + node.evidence().description() : null;
	}

	@Override
	public Image getImage(Object element) {
		return element instanceof RequirementNode node ? Verdicts.image(node.evidence().proof().verdict()) : null;
	}
}

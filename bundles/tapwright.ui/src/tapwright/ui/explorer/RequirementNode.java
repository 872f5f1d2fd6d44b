// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.explorer;

import java.util.Objects;

import org.eclipse.core.resources.IFile;

import tapwright.core.verify.RequirementEvidence;

/**
 * A requirement below its filter in a tree. Two nodes are equal when they stand for the same requirement, whatever was proven of it,
 * so that trees stay open when evidence is new.
 */
public final class RequirementNode {

	private final IFile file;
	private final RequirementEvidence evidence;

	RequirementNode(IFile file, RequirementEvidence evidence) {
		this.file = file;
		this.evidence = evidence;
	}

	/** File of the filter. */
	public IFile file() {
		return file;
	}

	/** What was proven. */
	public RequirementEvidence evidence() {
		return evidence;
	}

	@Override
	public boolean equals(Object other) {
		return other instanceof RequirementNode node && node.file.equals(file) && node.evidence.id().equals(evidence.id());
	}

	@Override
	public int hashCode() {
		return Objects.hash(file, evidence.id());
	}
}

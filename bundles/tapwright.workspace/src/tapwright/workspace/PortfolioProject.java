// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.CoreException;

import tapwright.core.graph.VerifiedFilter;
import tapwright.core.graph.VerifiedPortfolio;
import tapwright.core.problem.Problem;
import tapwright.core.quantity.Expression;
import tapwright.core.verify.Partners;
import tapwright.model.io.ModelFiles;
import tapwright.workspace.internal.EvidenceListeners;
import tapwright.workspace.internal.FilterFiles;
import tapwright.workspace.internal.ProjectVerification;

/**
 * A portfolio in the workspace: a handle on a project, cheap to make, equal to others on the same project. All questions are answered
 * from memory and may come from any thread; adapt a resource to this class, or use {@link #of(IResource)}.
 */
public record PortfolioProject(IProject project) {

	/** The portfolio that a resource belongs to; nothing when its project is closed or no portfolio. */
	public static Optional<PortfolioProject> of(IResource resource) {
		IProject project = resource.getProject();
		try {
			return project != null && project.isOpen() && project.hasNature(PortfolioNature.ID)
					? Optional.of(new PortfolioProject(project))
					: Optional.empty();
		} catch (CoreException e) {
			return Optional.empty(); // closed in between
		}
	}

	/** Adds a listener for all portfolios; adding it twice has no effect. */
	public static void addListener(EvidenceListener listener) {
		EvidenceListeners.add(listener);
	}

	/** Removes a listener. */
	public static void removeListener(EvidenceListener listener) {
		EvidenceListeners.remove(listener);
	}

	/** The root file; it may not exist. */
	public IFile portfolioFile() {
		return project.getFile(ModelFiles.PORTFOLIO_FILE);
	}

	/** The present filter files in the order of their paths, verified or not. */
	public List<IFile> filterFiles() {
		try {
			return FilterFiles.in(project);
		} catch (CoreException e) {
			return List.of(); // closed in between
		}
	}

	/**
	 * The parameters as they were at the last verification, for verifying content that is not saved. When nothing was verified since
	 * the project was opened, they are read from the file.
	 */
	public Expression.Names parameters() {
		return ProjectVerification.of(project).parameters();
	}

	/** The other filters of the portfolio as they are on disk, for verifying content that is not saved. Reads files when asked. */
	public Partners partners() {
		return ProjectVerification.of(project).partners();
	}

	/** The newest evidence of a filter file; nothing when it was not verified yet or cannot be read. */
	public Optional<PresentEvidence> evidence(IFile file) {
		var verification = ProjectVerification.of(project);
		return verification.state().filter(FilterFiles.path(file)).flatMap(VerifiedFilter::evidence)
				.map(evidence -> new PresentEvidence(evidence, verification.isStale(file)));
	}

	/** The newest evidence of all filters that could be read. */
	public List<FileEvidence> evidence() {
		var found = new ArrayList<FileEvidence>();
		for (IFile file : filterFiles()) {
			evidence(file).ifPresent(present -> found.add(new FileEvidence(file, present)));
		}
		return found;
	}

	/** The problems of a filter file or of the root file, as they were found at the last verification. */
	public List<Problem> problems(IFile file) {
		return ProjectVerification.of(project).state().problems(FilterFiles.path(file));
	}

	/** The whole state after the last verification; without files when nothing was verified yet. */
	public VerifiedPortfolio state() {
		return ProjectVerification.of(project).state();
	}

	/** Starts a verification in the background unless there was one since the project was opened; listeners hear of its end. */
	public void ensureVerified() {
		ProjectVerification.of(project).ensureVerified();
	}

	/** A filter file with its evidence. */
	public record FileEvidence(IFile file, PresentEvidence evidence) {
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace.internal;

import java.io.IOException;
import java.util.HashMap;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.concurrent.CancellationException;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IFolder;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.IPath;
import org.eclipse.core.runtime.QualifiedName;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.Job;
import org.osgi.framework.FrameworkUtil;

import tapwright.core.graph.Change;
import tapwright.core.graph.EvidenceCache;
import tapwright.core.graph.EvidenceFolder;
import tapwright.core.graph.EvidenceStore;
import tapwright.core.graph.PortfolioVerifier;
import tapwright.core.graph.VerifiedFilter;
import tapwright.core.graph.VerifiedPortfolio;
import tapwright.core.portfolio.FilePartners;
import tapwright.core.quantity.Expression;
import tapwright.core.verify.FilterQuestion;
import tapwright.core.verify.Partners;
import tapwright.dsp.Progress;
import tapwright.dsp.verify.Proof;
import tapwright.model.io.ModelFiles;
import tapwright.workspace.PortfolioProject;
import tapwright.workspace.ProblemMarkers;

/**
 * What is known of one project while it is open. Reading is possible from any thread; verification takes place under the rule of the
 * project, so that there is one at a time.
 */
public final class ProjectVerification {

	/** Name of the folder for what is derived, in the project. */
	public static final String DERIVED_FOLDER = ".tapwright";

	private static final QualifiedName KEY = new QualifiedName("tapwright.workspace", "verification");

	/** One verified state with the stamps that its files had. */
	private record Snapshot(VerifiedPortfolio state, Map<String, Long> stamps) {
	}

	private static final Snapshot NOTHING = new Snapshot(VerifiedPortfolio.EMPTY, Map.of());

	private final IProject project;
	private final EvidenceCache cache;
	private final PortfolioVerifier verifier;
	private final Job loading;
	private volatile Snapshot snapshot = NOTHING;

	private ProjectVerification(IProject project) {
		this.project = project;
		this.cache = new EvidenceCache(store(project));
		this.verifier = new PortfolioVerifier(new ProjectContent(project), cache);
		this.loading = Job.create("Verifying " + project.getName(), monitor -> {
			try {
				if (project.isAccessible() && !isVerified()) {
					run(Change.EVERYTHING, new MonitorProgress(monitor, () -> false));
				}
				return Status.OK_STATUS;
			} catch (CancellationException e) {
				return Status.CANCEL_STATUS;
			} catch (CoreException e) {
				return e.getStatus();
			}
		});
		loading.setRule(project);
	}

	/** What is known of a project; lives until the project is closed. */
	public static ProjectVerification of(IProject project) {
		synchronized (KEY) {
			try {
				if (project.getSessionProperty(KEY) instanceof ProjectVerification known && known.project.equals(project)) {
					return known;
				}
				var verification = new ProjectVerification(project);
				project.setSessionProperty(KEY, verification);
				return verification;
			} catch (CoreException e) {
				return new ProjectVerification(project); // it is closed: nothing is known, and nothing is kept
			}
		}
	}

	/** The last verified state; without files when there was none. */
	public VerifiedPortfolio state() {
		return snapshot.state();
	}

	/** Whether there was a verification since the project was opened. */
	public boolean isVerified() {
		return snapshot != NOTHING;
	}

	/** The parameters at the last verification, or now when there was none. */
	public Expression.Names parameters() {
		return isVerified() ? state().parameters() : verifier.readParameters();
	}

	/** The filters of the project as they are on disk. */
	public Partners partners() {
		return new FilePartners(new ProjectContent(project), parameters());
	}

	/** Whether a file, or the root file, has other content than at its last verification. */
	public boolean isStale(IFile file) {
		return isOther(file) || isOther(project.getFile(ModelFiles.PORTFOLIO_FILE));
	}

	/** How many filters were verified by computing since the project was opened. */
	public long computed() {
		return cache.computed();
	}

	/** Starts a verification in the background unless there was one. */
	public void ensureVerified() {
		if (!isVerified()) {
			loading.schedule();
		}
	}

	/** Forgets the verified state and its markers; the evidence stays in the cache. */
	void forget() throws CoreException {
		snapshot = NOTHING;
		ProblemMarkers.deleteAll(project);
		EvidenceListeners.fire(new PortfolioProject(project));
	}

	/**
	 * Verifies what a change can have touched, and brings markers up to date. Under the rule of the project.
	 *
	 * @throws CancellationException
	 *             when cancelled; state and markers are then as before
	 */
	void run(Change change, Progress progress) throws CoreException {
		if (change.isEmpty()) {
			return;
		}
		Snapshot before = snapshot;
		Map<String, Long> stamps = stamps(before, change); // before reading: a later change makes the evidence stale
		VerifiedPortfolio after;
		try {
			after = verifier.update(before.state(), change, progress);
		} catch (IOException e) {
			throw new CoreException(Status.error(project.getName() + " cannot be verified: " + e.getMessage(), e));
		}
		updateMarkers(before.state(), after, change);
		snapshot = new Snapshot(after, stamps);
		showDerivedFolder();
		cache.takeFailure().ifPresent(failure -> ILog.get()
				.warn("Evidence of " + project.getName() + " could not be kept and will be computed again", failure));
		EvidenceListeners.fire(new PortfolioProject(project));
	}

	private Map<String, Long> stamps(Snapshot before, Change change) throws CoreException {
		Map<String, Long> stamps = new HashMap<>();
		Set<String> changed = new TreeSet<>(change.changed());
		if (change.everything()) {
			FilterFiles.in(project).forEach(file -> changed.add(FilterFiles.path(file)));
			changed.add(ModelFiles.PORTFOLIO_FILE);
		} else {
			stamps.putAll(before.stamps());
		}
		stamps.keySet().removeAll(change.removed());
		changed.forEach(path -> stamps.put(path, project.getFile(path).getModificationStamp()));
		return stamps;
	}

	private boolean isOther(IFile file) {
		return snapshot.stamps().getOrDefault(FilterFiles.path(file), (long) IResource.NULL_STAMP) != file.getModificationStamp();
	}

	private void updateMarkers(VerifiedPortfolio before, VerifiedPortfolio after, Change change) throws CoreException {
		Set<String> paths = new TreeSet<>(change.changed());
		if (change.everything()) {
			after.filters().stream().map(VerifiedFilter::path).forEach(paths::add);
			paths.add(ModelFiles.PORTFOLIO_FILE);
		} else {
			paths.addAll(before.problems().keySet());
			paths.addAll(after.problems().keySet());
			paths.removeIf(path -> !change.changed().contains(path) && before.problems(path).equals(after.problems(path)));
		}
		for (String path : paths) {
			IFile file = project.getFile(path);
			if (file.exists()) {
				ProblemMarkers.replaceAll(file, after.problems(path));
			}
		}
		deleteStrayMarkers();
	}

	// Markers travel with a file that is moved, also to where it is no present filter any more.
	private void deleteStrayMarkers() throws CoreException {
		for (IMarker marker : project.findMarkers(ProblemMarkers.TYPE, true, IResource.DEPTH_INFINITE)) {
			if (!FilterFiles.isFilter(marker.getResource()) && !FilterFiles.isRoot(marker.getResource())) {
				marker.delete();
			}
		}
	}

	// The cache writes past the workspace; a folder that is out of step could not be moved or deleted with its project.
	private void showDerivedFolder() throws CoreException {
		IFolder folder = project.getFolder(DERIVED_FOLDER);
		folder.refreshLocal(IResource.DEPTH_INFINITE, null);
		if (folder.exists() && !folder.isDerived()) {
			folder.setDerived(true, null);
		}
	}

	private static EvidenceStore store(IProject project) {
		IPath location = project.getLocation();
		return location == null ? EvidenceStore.NONE
				: new EvidenceFolder(location.toPath().resolve(DERIVED_FOLDER), version());
	}

	// Other code may prove more, or prove better: evidence is kept for exactly the version that found it.
	private static String version() {
		return version(Proof.class) + "-" + version(FilterQuestion.class);
	}

	private static String version(Class<?> type) {
		return FrameworkUtil.getBundle(type).getVersion().toString();
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace.internal;

import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.CancellationException;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IResourceDelta;
import org.eclipse.core.resources.IncrementalProjectBuilder;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.OperationCanceledException;
import org.eclipse.core.runtime.jobs.ISchedulingRule;

import tapwright.core.graph.Change;

/** Has verified what a save can have touched. Knows which files changed and when to give way; the rest is elsewhere. */
public final class PortfolioBuilder extends IncrementalProjectBuilder {

	private static final int NEW_CONTENT = IResourceDelta.CONTENT | IResourceDelta.REPLACED | IResourceDelta.TYPE;

	@Override
	public ISchedulingRule getRule(int kind, Map<String, String> args) {
		return getProject(); // other projects can be changed while this one is verified
	}

	@Override
	protected IProject[] build(int kind, Map<String, String> args, IProgressMonitor monitor) throws CoreException {
		ProjectVerification verification = ProjectVerification.of(getProject());
		IResourceDelta delta = kind == FULL_BUILD || !verification.isVerified() ? null : getDelta(getProject());
		Change change = delta == null ? Change.EVERYTHING : changeIn(delta);
		try {
			verification.run(change, new MonitorProgress(monitor, () -> kind == AUTO_BUILD && isInterrupted()));
		} catch (CancellationException e) {
			if (kind != AUTO_BUILD || !isInterrupted()) {
				throw new OperationCanceledException();
			}
			rememberLastBuiltState(); // gives way to a save that waits; an exception would force a full build next time
		}
		return null;
	}

	@Override
	protected void clean(IProgressMonitor monitor) throws CoreException {
		ProjectVerification.of(getProject()).forget();
	}

	private static Change changeIn(IResourceDelta delta) throws CoreException {
		Set<String> changed = new HashSet<>();
		Set<String> removed = new HashSet<>();
		delta.accept(child -> {
			IResource resource = child.getResource();
			if (FilterFiles.isFilter(resource) || FilterFiles.isRoot(resource)) {
				String path = FilterFiles.path((IFile) resource);
				if (child.getKind() == IResourceDelta.REMOVED) {
					removed.add(path);
				} else if (child.getKind() == IResourceDelta.ADDED || (child.getFlags() & NEW_CONTENT) != 0) {
					changed.add(path);
				}
			}
			return true;
		});
		return Change.of(changed, removed);
	}
}

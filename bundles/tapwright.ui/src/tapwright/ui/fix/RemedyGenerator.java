// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.fix;

import java.util.Optional;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.ui.IMarkerResolution;
import org.eclipse.ui.IMarkerResolutionGenerator2;

import tapwright.core.problem.ProblemKind;
import tapwright.workspace.ProblemMarkers;

/** Offers quick fixes for problems of filters. Says quickly what can be looked for; looking takes place when one is chosen. */
public final class RemedyGenerator implements IMarkerResolutionGenerator2 {

	@Override
	public boolean hasResolutions(IMarker marker) {
		return search(marker).isPresent();
	}

	@Override
	public IMarkerResolution[] getResolutions(IMarker marker) {
		return search(marker).map(search -> new IMarkerResolution[] { new RemedyResolution(search, RemedyDialog::choose) })
				.orElse(new IMarkerResolution[0]);
	}

	private static Optional<RemedySearch> search(IMarker marker) {
		Optional<ProblemKind> kind = marker.getResource() instanceof IFile ? ProblemMarkers.kind(marker) : Optional.empty();
		return kind.flatMap(found -> switch (found) {
		case MISSED -> Optional.of(RemedySearch.MEET);
		case STALE -> Optional.of(RemedySearch.DESIGN_AGAIN);
		default -> Optional.empty();
		});
	}
}

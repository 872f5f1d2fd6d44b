// SPDX-License-Identifier: EPL-2.0
package tapwright.ui;

import java.util.UUID;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;

import tapwright.model.Filter;
import tapwright.model.GainRequirement;
import tapwright.model.ModelFactory;
import tapwright.model.RealCoefficients;
import tapwright.model.io.ModelFiles;
import tapwright.workspace.PortfolioNature;
import tapwright.workspace.ProblemMarkers;

/** A portfolio for one test, with a moving average of four samples: its gain is 1 at 0 Hz and 0 at a quarter of the rate. */
final class Sample implements AutoCloseable {

	final IProject project;
	final IFile filter;

	Sample() throws CoreException {
		project = ResourcesPlugin.getWorkspace().getRoot().getProject("sample-" + UUID.randomUUID());
		project.create(null);
		project.open(null);
		filter = project.getFile("average.filter");
		filter.create(ModelFiles.toBytes(movingAverage()), IResource.FORCE, null);
		PortfolioNature.addTo(project, null);
	}

	static Filter movingAverage() {
		Filter filter = ModelFactory.eINSTANCE.createFilter();
		filter.setName("average");
		filter.setIdentity("7c7a5f0e-2f0f-4a55-9f0d-54c63a9c1d11");
		filter.setSampleRate("8 kHz");
		GainRequirement ceiling = ModelFactory.eINSTANCE.createGainRequirement();
		ceiling.setId("ceiling");
		ceiling.setFrom("0");
		ceiling.setTo("4 kHz");
		ceiling.setMax("0.1");
		filter.getRequirements().add(ceiling);
		RealCoefficients taps = ModelFactory.eINSTANCE.createRealCoefficients();
		for (int k = 0; k < 4; k++) {
			taps.getValues().add(0.25);
		}
		filter.setCoefficients(taps);
		return filter;
	}

	/** How many problems our builder has found in the filter. */
	int problems() {
		try {
			return filter.findMarkers(ProblemMarkers.TYPE, true, IResource.DEPTH_ZERO).length;
		} catch (CoreException e) {
			throw new IllegalStateException(e);
		}
	}

	IMarker problem() throws CoreException {
		return filter.findMarkers(ProblemMarkers.TYPE, true, IResource.DEPTH_ZERO)[0];
	}

	@Override
	public void close() throws CoreException {
		Ui.page().closeAllEditors(false);
		project.delete(true, true, null);
	}
}

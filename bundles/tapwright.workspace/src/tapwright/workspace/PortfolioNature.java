// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace;

import java.util.Arrays;
import java.util.stream.Stream;

import org.eclipse.core.resources.ICommand;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IProjectDescription;
import org.eclipse.core.resources.IProjectNature;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;

/** Makes a project a portfolio: its filters are verified whenever a file is saved. */
public final class PortfolioNature implements IProjectNature {

	/** Id of this nature. */
	public static final String ID = "tapwright.workspace.nature";
	/** Id of the builder that comes with it. */
	public static final String BUILDER_ID = "tapwright.workspace.builder";

	private IProject project;

	/**
	 * Gives a project this nature; does nothing when it has it. Takes the rule of the project.
	 *
	 * @throws CoreException
	 *             when the project is closed or its description cannot be written
	 */
	public static void addTo(IProject project, IProgressMonitor monitor) throws CoreException {
		IProjectDescription description = project.getDescription();
		if (!description.hasNature(ID)) {
			description.setNatureIds(Stream.concat(Stream.of(description.getNatureIds()), Stream.of(ID)).toArray(String[]::new));
			project.setDescription(description, monitor);
		}
	}

	@Override
	public void configure() throws CoreException {
		IProjectDescription description = project.getDescription();
		if (Arrays.stream(description.getBuildSpec()).noneMatch(PortfolioNature::isOurs)) {
			ICommand command = description.newCommand();
			command.setBuilderName(BUILDER_ID);
			description.setBuildSpec(
					Stream.concat(Stream.of(description.getBuildSpec()), Stream.of(command)).toArray(ICommand[]::new));
			project.setDescription(description, null);
		}
	}

	@Override
	public void deconfigure() throws CoreException {
		IProjectDescription description = project.getDescription();
		description.setBuildSpec(
				Arrays.stream(description.getBuildSpec()).filter(command -> !isOurs(command)).toArray(ICommand[]::new));
		project.setDescription(description, null);
		ProblemMarkers.deleteAll(project);
	}

	@Override
	public IProject getProject() {
		return project;
	}

	@Override
	public void setProject(IProject project) {
		this.project = project;
	}

	private static boolean isOurs(ICommand command) {
		return command.getBuilderName().equals(BUILDER_ID);
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.model.io;

import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.resource.Resource.Diagnostic;
import org.eclipse.emf.ecore.xmi.ClassNotFoundException;
import org.eclipse.emf.ecore.xmi.FeatureNotFoundException;
import org.eclipse.emf.ecore.xmi.IllegalValueException;
import org.eclipse.emf.ecore.xmi.PackageNotFoundException;

/** Puts what EMF reports while reading into words that say what to do. */
final class LoadProblems {

	private LoadProblems() {
	}

	/** A finding of our own. */
	record Problem(String reason, int getLine, int getColumn) implements Diagnostic {

		@Override
		public String getMessage() {
			return reason;
		}

		@Override
		public String getLocation() {
			return null;
		}
	}

	static ModelFileException explain(Diagnostic problem, String file) {
		return new ModelFileException(file, problem.getLine(), problem.getColumn(), reason(problem));
	}

	private static String reason(Diagnostic problem) {
		return switch (problem) {
		case FeatureNotFoundException unknown -> "'" + unknown.getName() + "' is not known in "
				+ (unknown.getObject() == null ? "this place" : nameOf(unknown.getObject())) + "; correct or remove it";
		case IllegalValueException illegal -> "'" + illegal.getValue() + "' is not a possible value of '"
				+ illegal.getFeature().getName() + "' in " + nameOf(illegal.getObject());
		case ClassNotFoundException unknown -> "'" + unknown.getName()
				+ "' is not known; the file may have been made by a newer version";
		case PackageNotFoundException unknown -> "the format '" + unknown.uri()
				+ "' is not known; the file may have been made by a newer version, or it is no Tapwright file";
		default -> withoutPlace(problem.getMessage());
		};
	}

	private static String nameOf(EObject object) {
		return object.eClass().getName();
	}

	// EMF appends '(file, line, column)', which the exception says itself.
	private static String withoutPlace(String message) {
		String first = message == null ? "cannot be read" : message.lines().findFirst().orElse("");
		return first.replaceFirst("^.*SAXParseException; [^;]*; ", "").replaceFirst(" \\([^()]*, \\d+, \\d+\\)$", "");
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.CoreException;

import tapwright.core.problem.Problem;
import tapwright.core.problem.ProblemKind;
import tapwright.core.verify.RequirementEvidence;
import tapwright.model.Severity;

/**
 * The only place that knows how a problem is kept in a marker. Attributes are there from the start: a marker is made in one step.
 */
public final class ProblemMarkers {

	/** Super-type of all our markers. The type of a problem kind is in {@link #type(ProblemKind)}. */
	public static final String TYPE = "tapwright.workspace.problem";

	/** String: {@link ProblemKind#code()}. */
	public static final String CODE = "code";
	/** String: name of the filter; missing when the problem concerns none. */
	public static final String FILTER = "filter";
	/** String: id of the requirement; missing when the problem concerns none. */
	public static final String REQUIREMENT = "requirement";
	/** String: name of the requirement's kind; with {@link #VERDICT} and the numbers on missed and unproven requirements. */
	public static final String REQUIREMENT_KIND = "requirementKind";
	/** String: name of the verdict in capitals. */
	public static final String VERDICT = "verdict";
	/** String: lower end of the margin, as a double is written in Java. */
	public static final String MARGIN_LOW = "marginLow";
	/** String: upper end of the margin. */
	public static final String MARGIN_HIGH = "marginHigh";
	/** String: the worst place, as a double is written in Java; missing when the requirement has no place. */
	public static final String WORST = "worst";
	/** String: unit of the worst place. */
	public static final String WORST_UNIT = "worstUnit";

	private ProblemMarkers() {
	}

	/** The marker type of a problem kind. */
	public static String type(ProblemKind kind) {
		return "tapwright.workspace." + kind.code();
	}

	/** The problem kind of a marker; nothing when it is not ours or is gone. */
	public static Optional<ProblemKind> kind(IMarker marker) {
		String code = marker.getAttribute(CODE, "");
		for (ProblemKind kind : ProblemKind.values()) {
			if (kind.code().equals(code)) {
				return Optional.of(kind);
			}
		}
		return Optional.empty();
	}

	/** A number that a marker holds as text; NaN when it has none. */
	public static double number(IMarker marker, String attribute) {
		return Double.parseDouble(marker.getAttribute(attribute, "NaN"));
	}

	/**
	 * Makes the markers of a resource match the problems. Markers that still hold stay as they are, so that lists do not flicker on
	 * every save. Takes the rule of the resource.
	 */
	public static void replaceAll(IResource resource, List<Problem> problems) throws CoreException {
		var missing = new ArrayList<>(problems);
		for (IMarker marker : resource.findMarkers(TYPE, true, IResource.DEPTH_ZERO)) {
			Optional<Problem> same = missing.stream().filter(problem -> holds(marker, problem)).findFirst();
			if (same.isPresent()) {
				missing.remove(same.get());
			} else {
				marker.delete();
			}
		}
		for (Problem problem : missing) {
			resource.createMarker(type(problem.kind()), attributes(problem));
		}
	}

	/** Removes all our markers from a resource and what is in it. */
	public static void deleteAll(IResource resource) throws CoreException {
		resource.deleteMarkers(TYPE, true, IResource.DEPTH_INFINITE);
	}

	private static boolean holds(IMarker marker, Problem problem) {
		try {
			return marker.getType().equals(type(problem.kind())) && attributes(problem).equals(marker.getAttributes());
		} catch (CoreException e) {
			return false; // somebody removed it in between
		}
	}

	// Markers that are kept take strings, whole numbers and booleans only, so numbers go in as text.
	private static Map<String, Object> attributes(Problem problem) {
		var attributes = new HashMap<String, Object>();
		attributes.put(IMarker.SEVERITY,
				problem.severity() == Severity.MUST ? IMarker.SEVERITY_ERROR : IMarker.SEVERITY_WARNING);
		attributes.put(IMarker.MESSAGE, problem.message());
		attributes.put(IMarker.LOCATION, problem.location());
		attributes.put(CODE, problem.kind().code());
		putUnlessEmpty(attributes, FILTER, problem.filter());
		putUnlessEmpty(attributes, REQUIREMENT, problem.requirement());
		if (problem.line() > 0) {
			attributes.put(IMarker.LINE_NUMBER, problem.line());
		}
		problem.evidence().ifPresent(evidence -> put(attributes, evidence));
		return attributes;
	}

	private static void put(Map<String, Object> attributes, RequirementEvidence evidence) {
		attributes.put(REQUIREMENT_KIND, evidence.kind());
		attributes.put(VERDICT, evidence.proof().verdict().name());
		attributes.put(MARGIN_LOW, Double.toString(evidence.proof().margin().lo()));
		attributes.put(MARGIN_HIGH, Double.toString(evidence.proof().margin().hi()));
		if (!Double.isNaN(evidence.proof().worst())) {
			attributes.put(WORST, Double.toString(evidence.proof().worst()));
			attributes.put(WORST_UNIT, evidence.placeUnit());
		}
	}

	private static void putUnlessEmpty(Map<String, Object> attributes, String name, String value) {
		if (!value.isEmpty()) {
			attributes.put(name, value);
		}
	}
}

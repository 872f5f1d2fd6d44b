// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Collection;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import org.apache.commons.math3.fraction.BigFraction;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.util.EcoreUtil;

import tapwright.core.InputException;
import tapwright.core.meta.Meta;
import tapwright.core.quantity.Expression;
import tapwright.core.quantity.Quantity;
import tapwright.core.quantity.Units;
import tapwright.core.verify.FilterEvidence;
import tapwright.core.verify.RequirementEvidence;
import tapwright.dsp.verify.Proof;
import tapwright.model.Evidence;
import tapwright.model.Filter;
import tapwright.model.ModelFactory;
import tapwright.model.ModelPackage;
import tapwright.model.Parameter;
import tapwright.model.Result;
import tapwright.model.Revision;
import tapwright.model.Verdict;

/** Takes what belongs into a revision from the present state: copies, so that nothing that happens later reaches it. */
public final class Snapshots {

	private static final Pattern NAME = Pattern.compile("[A-Za-z][A-Za-z0-9_]*");

	private static final Set<EReference> CONTENT = Set.of(ModelPackage.Literals.REVISION__FILTER,
			ModelPackage.Literals.REVISION__PARAMETERS);

	private Snapshots() {
	}

	/**
	 * The filter with the values of all parameters that it mentions. Author, time, message and evidence are left empty.
	 *
	 * @param defined
	 *            parameters of the portfolio, for their units
	 * @param values
	 *            their values
	 * @throws InputException
	 *             when a parameter that the filter mentions has no value
	 */
	public static Revision of(Filter filter, Collection<Parameter> defined, Expression.Names values) throws InputException {
		Revision revision = ModelFactory.eINSTANCE.createRevision();
		revision.setFilter(EcoreUtil.copy(filter));
		Set<String> mentioned = mentioned(filter);
		var byName = new TreeMap<String, Parameter>();
		defined.stream().filter(parameter -> mentioned.contains(parameter.getName()))
				.forEach(parameter -> byName.put(parameter.getName(), parameter));
		for (Parameter parameter : byName.values()) {
			Parameter copy = ModelFactory.eINSTANCE.createParameter();
			copy.setName(parameter.getName());
			copy.setUnit(parameter.getUnit());
			copy.setValue(inUnit(values.value(parameter.getName()), parameter.getUnit().getLiteral()));
			revision.getParameters().add(copy);
		}
		return revision;
	}

	/** Hash of filter and parameters alone. */
	public static String contentHash(Revision revision) {
		return CanonicalForm.hash(revision, CONTENT);
	}

	/** What was proven, as it is kept. */
	public static Evidence evidence(FilterEvidence found, String tool) {
		Evidence evidence = ModelFactory.eINSTANCE.createEvidence();
		evidence.setTool(tool);
		evidence.setVerdict(same(found.verdict()));
		for (RequirementEvidence requirement : found.requirements()) {
			Proof proof = requirement.proof();
			Result result = ModelFactory.eINSTANCE.createResult();
			result.setRequirement(requirement.id());
			result.setKind(requirement.kind());
			result.setVerdict(same(proof.verdict()));
			result.setWorst(proof.worst());
			result.setValueLow(proof.value().lo());
			result.setValueHigh(proof.value().hi());
			result.setLimit(proof.limit());
			result.setMarginLow(proof.margin().lo());
			result.setMarginHigh(proof.margin().hi());
			evidence.getResults().add(result);
		}
		return evidence;
	}

	private static Set<String> mentioned(Filter filter) {
		var names = new HashSet<String>();
		collect(filter, names);
		filter.eAllContents().forEachRemaining(object -> collect(object, names));
		return names;
	}

	private static void collect(EObject object, Set<String> names) {
		for (EAttribute attribute : object.eClass().getEAllAttributes()) {
			if (Meta.isQuantity(attribute) && object.eGet(attribute) instanceof String text) {
				Matcher matcher = NAME.matcher(text);
				while (matcher.find()) {
					names.add(matcher.group());
				}
			}
		}
	}

	// Exact: a decimal where there is one, otherwise a quotient, both of which the model's numbers can say.
	private static String inUnit(Quantity quantity, String unit) {
		BigFraction value = quantity.value().divide(Units.of(unit).orElseThrow().value());
		BigInteger denominator = value.getDenominator();
		for (BigInteger factor : List.of(BigInteger.TWO, BigInteger.valueOf(5))) {
			while (denominator.mod(factor).signum() == 0) {
				denominator = denominator.divide(factor);
			}
		}
		if (!denominator.equals(BigInteger.ONE)) {
			return value.getNumerator() + " / " + value.getDenominator();
		}
		return new BigDecimal(value.getNumerator()).divide(new BigDecimal(value.getDenominator()))
				.stripTrailingZeros().toPlainString();
	}

	// The verdicts of the model and of the proofs have the same names.
	private static Verdict same(tapwright.dsp.verify.Verdict verdict) {
		return Verdict.valueOf(verdict.name());
	}
}

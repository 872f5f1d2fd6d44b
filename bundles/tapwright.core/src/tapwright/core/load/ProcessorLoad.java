// SPDX-License-Identifier: EPL-2.0
package tapwright.core.load;

import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A processor with all filters that are deployed on it. Immutable.
 *
 * @param budget
 *            what the processor has
 * @param demands
 *            what each filter asks, in the order of the filters
 */
public record ProcessorLoad(Budget budget, List<Demand> demands) {

	/** Takes a copy. */
	public ProcessorLoad {
		demands = List.copyOf(demands);
	}

	/** How much of a resource all filters use together. */
	public double used(Resource resource) {
		return demands.stream().mapToDouble(resource::of).sum();
	}

	/** How much of a resource there is; nothing when that is not stated. */
	public OptionalDouble available(Resource resource) {
		return resource.of(budget);
	}

	/** How much of a resource one of the filters uses. */
	public double used(Resource resource, Demand demand) {
		return resource.of(demand);
	}

	/** Whether the filters use more than there is. */
	public boolean isOverloaded(Resource resource) {
		OptionalDouble available = available(resource);
		return available.isPresent() && used(resource) > available.getAsDouble();
	}

	/** The filters in the order of their share of a resource, largest first. */
	public List<Demand> largest(Resource resource) {
		return demands.stream().sorted(Comparator.comparingDouble((Demand demand) -> resource.of(demand)).reversed()).toList();
	}
}

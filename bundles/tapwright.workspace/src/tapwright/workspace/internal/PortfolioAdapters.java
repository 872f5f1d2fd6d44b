// SPDX-License-Identifier: EPL-2.0
package tapwright.workspace.internal;

import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.IAdapterFactory;

import tapwright.workspace.PortfolioProject;

/** Finds the portfolio that a resource belongs to. */
public final class PortfolioAdapters implements IAdapterFactory {

	@Override
	public <T> T getAdapter(Object resource, Class<T> type) {
		return type.cast(PortfolioProject.of((IResource) resource).orElse(null));
	}

	@Override
	public Class<?>[] getAdapterList() {
		return new Class<?>[] { PortfolioProject.class };
	}
}

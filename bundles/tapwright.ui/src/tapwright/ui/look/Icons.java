// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.look;

import org.eclipse.jface.resource.ImageDescriptor;
import org.eclipse.jface.resource.ImageRegistry;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.ResourceLocator;
import org.eclipse.swt.graphics.Image;

import tapwright.ui.Tasks;

/** The icons of this bundle. Images belong to the registry: nobody else disposes them. UI thread. */
public final class Icons {

	public static final String ADD = "add";
	public static final String ARITHMETIC = "arithmetic";
	public static final String BACK = "back";
	public static final String BOARD = "board";
	public static final String COEFFICIENTS = "coefficients";
	public static final String COMPUTE = "compute";
	public static final String COPY = "copy";
	public static final String DOWN = "down";
	public static final String DUPLICATE = "duplicate";
	public static final String EVIDENCE = "evidence";
	public static final String FILTER = "filter";
	public static final String HOME = "home";
	public static final String PASTE = "paste";
	public static final String PORTFOLIO = "portfolio";
	public static final String REMOVE = "remove";
	public static final String REQUIREMENT = "requirement";
	public static final String RESPONSE = "response";
	public static final String STALE = "stale";
	public static final String UP = "up";
	public static final String WORST = "worst";

	private Icons() {
	}

	/** The icon with the given file name, without extension. */
	public static Image get(String name) {
		String key = Tasks.PLUGIN + "/" + name;
		ImageRegistry registry = JFaceResources.getImageRegistry();
		if (registry.getDescriptor(key) == null) {
			registry.put(key, descriptor(name));
		}
		return registry.get(key);
	}

	/** Describes the icon with the given file name, without extension. Any thread. */
	public static ImageDescriptor descriptor(String name) {
		return ResourceLocator.imageDescriptorFromBundle(Tasks.PLUGIN, "icons/" + name + ".svg")
				.orElseGet(ImageDescriptor::getMissingImageDescriptor);
	}
}

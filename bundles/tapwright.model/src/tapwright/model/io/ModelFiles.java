// SPDX-License-Identifier: EPL-2.0
package tapwright.model.io;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;

import tapwright.model.ModelPackage;

/** Reads and writes model files outside of a resource set. */
public final class ModelFiles {

	/** Extension of filter files. */
	public static final String FILTER_EXTENSION = "filter";
	/** Name of the root file of a portfolio. */
	public static final String PORTFOLIO_FILE = "portfolio.tapwright";

	private ModelFiles() {
	}

	/**
	 * Reads the one object of a file.
	 *
	 * @throws ModelFileException
	 *             when the file does not exist, is not well formed, holds something else than asked for, or holds anything that
	 *             the model does not know
	 */
	public static <T extends EObject> T load(Path file, Class<T> type) throws IOException {
		byte[] content;
		try {
			content = Files.readAllBytes(file);
		} catch (NoSuchFileException e) {
			throw new ModelFileException(file.toString(), 0, 0, "there is no such file");
		}
		return parse(content, file.toString(), type);
	}

	/**
	 * Reads the one object of a file's content.
	 *
	 * @param name
	 *            of the file, for messages
	 */
	public static <T extends EObject> T parse(byte[] content, String name, Class<T> type) throws ModelFileException {
		ModelPackage.eINSTANCE.eClass(); // registers the format
		var resource = new ModelResource(URI.createURI("memory:/model"));
		resource.read(content, name);
		EObject root = resource.root();
		if (!type.isInstance(root)) {
			throw new ModelFileException(name, 1, 1,
					"holds a " + root.eClass().getName() + ", but a " + type.getSimpleName() + " is expected");
		}
		resource.getContents().clear();
		return type.cast(root);
	}

	/** The bytes of a file that holds the object; the object stays where it is. */
	public static byte[] toBytes(EObject root) {
		var resource = new ModelResource(URI.createURI("memory:/model"));
		resource.getContents().add(EcoreUtil.copy(root));
		return resource.toBytes();
	}

	/** Writes the object, whole or not at all. */
	public static void save(EObject root, Path file) throws IOException {
		AtomicFiles.write(file, toBytes(root));
	}
}

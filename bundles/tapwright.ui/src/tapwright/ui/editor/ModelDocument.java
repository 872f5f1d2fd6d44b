// SPDX-License-Identifier: EPL-2.0
package tapwright.ui.editor;

import java.io.IOException;
import java.io.InputStream;
import java.util.function.Function;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.resources.IWorkspace;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.Status;
import org.eclipse.emf.common.command.BasicCommandStack;
import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.edit.domain.AdapterFactoryEditingDomain;
import org.eclipse.emf.edit.domain.EditingDomain;

import tapwright.core.quantity.Expression;
import tapwright.model.io.AtomicFiles;
import tapwright.model.io.ModelFileException;
import tapwright.model.io.ModelResource;
import tapwright.model.provider.ModelItemProviderAdapterFactory;
import tapwright.ui.field.ModelAccess;

/**
 * A model file that is being edited: its content, its command stack, and what is on disk. UI thread.
 *
 * @param <T>
 *            what the file holds
 */
public final class ModelDocument<T extends EObject> implements ModelAccess {

	private final IFile file;
	private final Class<T> type;
	private final Function<T, Expression.Names> parameters;
	private final ModelItemProviderAdapterFactory adapterFactory = new ModelItemProviderAdapterFactory();
	private final BasicCommandStack commandStack = new BasicCommandStack();
	private final AdapterFactoryEditingDomain domain = new AdapterFactoryEditingDomain(adapterFactory, commandStack);
	private final ModelResource resource;
	private long stamp = IResource.NULL_STAMP;

	/**
	 * A document without content; {@link #load()} fills it.
	 *
	 * @param parameters
	 *            gives the parameters that numbers in the content may use
	 */
	public ModelDocument(IFile file, Class<T> type, Function<T, Expression.Names> parameters) {
		this.file = file;
		this.type = type;
		this.parameters = parameters;
		this.resource = new ModelResource(URI.createPlatformResourceURI(file.getFullPath().toString(), true));
		domain.getResourceSet().getResources().add(resource);
	}

	/**
	 * Reads the file in place of the present content and forgets all commands.
	 *
	 * @throws ModelFileException
	 *             with place and reason, when the content makes no sense
	 * @throws CoreException
	 *             when the file cannot be read
	 */
	public void load() throws ModelFileException, CoreException, IOException {
		byte[] content;
		try (InputStream stream = file.getContents(true)) {
			content = stream.readAllBytes();
		}
		stamp = file.getModificationStamp();
		resource.read(content, file.getName());
		if (!type.isInstance(resource.root())) {
			String found = resource.root().eClass().getName();
			resource.unload();
			throw new ModelFileException(file.getName(), 1, 1,
					"holds a " + found + ", but a " + type.getSimpleName() + " is expected");
		}
		commandStack.flush();
	}

	/**
	 * Writes the content, whole or not at all, and lets the workspace know.
	 *
	 * @throws CoreException
	 *             when it cannot be written; the file is then as it was
	 */
	public void save(IProgressMonitor monitor) throws CoreException, IOException {
		byte[] content = resource.toBytes();
		ResourcesPlugin.getWorkspace().run(inner -> {
			try {
				AtomicFiles.write(file.getLocation().toPath(), content);
			} catch (IOException e) {
				throw new CoreException(
						Status.error(file.getName() + " could not be written: " + e.getMessage(), e));
			}
			file.refreshLocal(IResource.DEPTH_ZERO, inner);
			stamp = file.getModificationStamp();
		}, ResourcesPlugin.getWorkspace().getRuleFactory().refreshRule(file), IWorkspace.AVOID_UPDATE,
				monitor);
		commandStack.saveIsDone();
	}

	/** Whether somebody else wrote the file since it was last read or written here. */
	public boolean isChangedOutside() {
		return file.exists() && file.getModificationStamp() != stamp;
	}

	/** Keeps the present content in face of what is on disk; it counts as seen. */
	public void keep() {
		stamp = file.getModificationStamp();
	}

	/** What the file holds. */
	public T root() {
		return type.cast(resource.root());
	}

	/** Whether there is content: the file could be read. */
	public boolean isLoaded() {
		return !resource.getContents().isEmpty();
	}

	/** The file. */
	public IFile file() {
		return file;
	}

	/** What makes undo, redo and the dirty mark. */
	public BasicCommandStack commandStack() {
		return commandStack;
	}

	@Override
	public EditingDomain domain() {
		return domain;
	}

	@Override
	public Expression.Names parameters() {
		return isLoaded() ? parameters.apply(root()) : Expression.Names.NONE;
	}

	/** Lets go of adapters. */
	public void dispose() {
		commandStack.flush();
		adapterFactory.dispose();
	}
}

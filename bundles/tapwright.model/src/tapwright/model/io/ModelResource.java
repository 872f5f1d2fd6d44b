// SPDX-License-Identifier: EPL-2.0
package tapwright.model.io;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.Map;

import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EPackage;
import org.eclipse.emf.ecore.xmi.XMLHelper;
import org.eclipse.emf.ecore.xmi.XMLLoad;
import org.eclipse.emf.ecore.xmi.XMLResource;
import org.eclipse.emf.ecore.xmi.impl.SAXXMIHandler;
import org.eclipse.emf.ecore.xmi.impl.XMILoadImpl;
import org.eclipse.emf.ecore.xmi.impl.XMIResourceImpl;
import org.xml.sax.helpers.DefaultHandler;

import tapwright.model.ModelPackage;

/** A file of the model: the format is fixed here and nowhere else. Confined to one thread like all EMF objects. */
public final class ModelResource extends XMIResourceImpl {

	// Document type declarations are refused: they could name other files to read.
	private static final Map<String, Boolean> PARSER_FEATURES = Map
			.of("http://apache.org/xml/features/disallow-doctype-decl", Boolean.TRUE);

	/** An empty resource. */
	public ModelResource(URI uri) {
		super(uri);
		setEncoding("UTF-8");
		Map<Object, Object> save = getDefaultSaveOptions();
		save.put(XMLResource.OPTION_LINE_WIDTH, 1); // every attribute starts a line, so that changes merge line by line
		save.put(OPTION_LINE_DELIMITER, "\n");
		Map<Object, Object> load = getDefaultLoadOptions();
		load.put(XMLResource.OPTION_USE_LEXICAL_HANDLER, Boolean.TRUE);
		load.put(XMLResource.OPTION_PARSER_FEATURES, PARSER_FEATURES);
	}

	/** The bytes that saving writes. */
	public byte[] toBytes() {
		var bytes = new ByteArrayOutputStream();
		try {
			save(bytes, null);
		} catch (IOException e) {
			throw new UncheckedIOException("writing to memory", e);
		}
		return bytes.toByteArray();
	}

	/**
	 * Reads the bytes in place of the present content.
	 *
	 * @param name
	 *            of the file, for messages
	 * @throws ModelFileException
	 *             with place and reason; the resource is then empty
	 */
	public void read(byte[] content, String name) throws ModelFileException {
		unload();
		getErrors().clear();
		IOException failure = null;
		try {
			load(new ByteArrayInputStream(content), null);
		} catch (IOException e) {
			failure = e;
		}
		if (failure != null || !getErrors().isEmpty()) {
			ModelFileException problem = getErrors().isEmpty()
					? new ModelFileException(name, 0, 0, failure.getLocalizedMessage())
					: LoadProblems.explain(getErrors().getFirst(), name);
			unload();
			throw problem;
		}
		if (getContents().size() != 1) {
			unload();
			throw new ModelFileException(name, 1, 1, "the file must hold exactly one object");
		}
	}

	/** The one object of the file. */
	public EObject root() {
		return getContents().getFirst();
	}

	@Override
	protected XMLLoad createXMLLoad() {
		return new XMILoadImpl(createXMLHelper()) {
			@Override
			protected DefaultHandler makeDefaultHandler() {
				return new Handler(ModelResource.this, helper, options);
			}
		};
	}

	/** Reports what EMF would drop: comments and processing instructions. */
	private static final class Handler extends SAXXMIHandler {

		Handler(XMLResource resource, XMLHelper helper, Map<?, ?> options) {
			super(resource, helper, options);
		}

		// EMF's global registry depends on the thread outside of OSGi; files are read on many.
		@Override
		protected EPackage getPackageForURI(String uri) {
			return ModelPackage.eNS_URI.equals(uri) ? ModelPackage.eINSTANCE : super.getPackageForURI(uri);
		}

		@Override
		public void comment(char[] text, int start, int length) {
			reject("comments would be lost when the file is saved; write them into a purpose, description or note");
		}

		@Override
		public void processingInstruction(String target, String data) {
			reject("the processing instruction '" + target + "' would be lost when the file is saved; remove it");
		}

		private void reject(String reason) {
			xmlResource.getErrors().add(new LoadProblems.Problem(reason, getLineNumber(), getColumnNumber()));
		}
	}
}

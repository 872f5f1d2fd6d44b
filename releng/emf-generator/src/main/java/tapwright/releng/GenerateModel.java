// SPDX-License-Identifier: EPL-2.0
package tapwright.releng;

import java.nio.file.Path;

import org.eclipse.emf.codegen.ecore.generator.Generator;
import org.eclipse.emf.codegen.ecore.generator.GeneratorAdapterFactory;
import org.eclipse.emf.codegen.ecore.genmodel.GenModel;
import org.eclipse.emf.codegen.ecore.genmodel.GenModelPackage;
import org.eclipse.emf.codegen.ecore.genmodel.generator.GenBaseGeneratorAdapter;
import org.eclipse.emf.codegen.ecore.genmodel.generator.GenModelGeneratorAdapterFactory;
import org.eclipse.emf.common.util.BasicDiagnostic;
import org.eclipse.emf.common.util.BasicMonitor;
import org.eclipse.emf.common.util.Diagnostic;
import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.plugin.EcorePlugin;
import org.eclipse.emf.ecore.resource.Resource;
import org.eclipse.emf.ecore.resource.impl.ResourceSetImpl;
import org.eclipse.emf.ecore.xmi.impl.XMIResourceFactoryImpl;

/**
 * Generates the code of the model and of its item providers from {@code tapwright.model/model/tapwright.genmodel}.
 * Into an empty place the same model gives the same bytes; over older code, EMF would merge.
 */
public final class GenerateModel {

	private static final String MODEL = "tapwright.model";
	private static final String EDIT = "tapwright.model.edit";

	private GenerateModel() {
	}

	/**
	 * Runs the generator; ends with exit code 1 when the model is not sound.
	 *
	 * @param args the folder that holds the bundles' folders; the model is read from there and the code written there
	 */
	public static void main(String[] args) {
		var bundles = Path.of(args[0]).toAbsolutePath();
		var genModel = load(bundles);
		var invalid = BasicDiagnostic.toDiagnostic(genModel.validate());
		if (invalid.getSeverity() != Diagnostic.OK) {
			fail(describe(invalid));
		}
		GeneratorAdapterFactory.Descriptor.Registry.INSTANCE.addDescriptor(GenModelPackage.eNS_URI,
				GenModelGeneratorAdapterFactory.DESCRIPTOR);
		genModel.setCanGenerate(true);
		var generator = new Generator();
		generator.setInput(genModel);
		// write over what is there, not beside it
		generator.getOptions().redirectionPattern = null;
		generate(generator, genModel, GenBaseGeneratorAdapter.MODEL_PROJECT_TYPE);
		generate(generator, genModel, GenBaseGeneratorAdapter.EDIT_PROJECT_TYPE);
	}

	private static GenModel load(Path bundles) {
		var resources = new ResourceSetImpl();
		resources.getResourceFactoryRegistry().getExtensionToFactoryMap().put(Resource.Factory.Registry.DEFAULT_EXTENSION,
				new XMIResourceFactoryImpl());
		GenModelPackage.eINSTANCE.eClass();
		for (var bundle : new String[] { MODEL, EDIT }) {
			// the trailing slash makes it a folder that project paths are resolved against
			var folder = URI.createFileURI(bundles.resolve(bundle) + "/");
			EcorePlugin.getPlatformResourceMap().put(bundle, folder);
		}
		var file = bundles.resolve(MODEL).resolve("model/tapwright.genmodel");
		var genModel = (GenModel) resources.getResource(URI.createFileURI(file.toString()), true).getContents().get(0);
		genModel.reconcile();
		return genModel;
	}

	private static void generate(Generator generator, GenModel genModel, Object projectType) {
		var result = generator.generate(genModel, projectType, new BasicMonitor());
		if (result.getSeverity() >= Diagnostic.ERROR) {
			fail(describe(result));
		}
	}

	private static String describe(Diagnostic diagnostic) {
		var text = new StringBuilder(diagnostic.getMessage());
		for (var child : diagnostic.getChildren()) {
			text.append(System.lineSeparator()).append(describe(child));
		}
		return text.toString();
	}

	private static void fail(String message) {
		System.err.println(message);
		System.exit(1);
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.io.File;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URI;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;

import org.apache.commons.math3.fraction.BigFraction;
import org.eclipse.emf.common.notify.Notifier;
import org.eclipse.emf.ecore.EObject;

import tapwright.dsp.verify.Effort;
import tapwright.model.ModelFactory;
import tapwright.model.Revision;
import tapwright.model.io.ModelResource;

/** Adds revisions in a process of its own: folder, number of the process, number of revisions. Prints the hash of each that is there. */
public final class RecordingProcess {

	private RecordingProcess() {
	}

	public static void main(String[] args) throws IOException {
		var store = new RevisionStore(Path.of(args[0]));
		for (int k = 0; k < Integer.parseInt(args[2]); k++) {
			Revision revision = revision(k % 2 == 0 ? "both" : args[1], k);
			try {
				System.out.println(store.add(revision, 1).hash());
			} catch (FileAlreadyExistsException e) {
				System.out.println(CanonicalForm.hash(revision));
			}
		}
	}

	static Process start(Path folder, int process, int count) {
		try {
			var command = new ArrayList<>(List.of(Path.of(System.getProperty("java.home"), "bin", "java").toString(), "-XX:TieredStopAtLevel=1",
					"-cp", classPath(), RecordingProcess.class.getName(), folder.toString(),
					Integer.toString(process), Integer.toString(count)));
			return new ProcessBuilder(command).redirectError(ProcessBuilder.Redirect.INHERIT).start();
		} catch (IOException e) {
			throw new UncheckedIOException(e);
		}
	}

	// By what is loaded here: a test launcher may hide the class path from the system property.
	private static String classPath() {
		return Stream.of(RecordingProcess.class, CanonicalForm.class, ModelFactory.class, Effort.class, EObject.class, Notifier.class,
				ModelResource.class.getSuperclass(), BigFraction.class).map(RecordingProcess::location).distinct()
				.collect(Collectors.joining(File.pathSeparator));
	}

	private static String location(Class<?> type) {
		return Path.of(URI.create(type.getProtectionDomain().getCodeSource().getLocation().toString())).toString();
	}

	/** Revisions by the same name and number have the same hash. */
	static Revision revision(String name, int k) {
		Revision revision = ModelFactory.eINSTANCE.createRevision();
		revision.setAuthor(name);
		revision.setTime("2026-03-01T12:00:00Z");
		revision.setMessage("number " + k);
		revision.setFilter(Samples.filter("-20"));
		return revision;
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.core.graph;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;

import com.google.gson.Gson;
import com.google.gson.GsonBuilder;

import tapwright.core.verify.FilterEvidence;

/** Keeps each piece of evidence as a JSON file named by its hash, in a folder that version control is told to ignore. */
public final class EvidenceFolder implements EvidenceStore {

	private static final String EXTENSION = ".json";
	private static final Gson GSON = new GsonBuilder().serializeSpecialFloatingPointValues().create();

	private final Path derived;
	private final Path evidence;
	private final Path present;

	/**
	 * @param derived
	 *            folder for what can be made again; made when it is needed
	 * @param version
	 *            of the code that finds evidence: evidence of another version is not used
	 */
	public EvidenceFolder(Path derived, String version) {
		this.derived = derived;
		this.evidence = derived.resolve("evidence");
		this.present = evidence.resolve(version);
	}

	@Override
	public Optional<FilterEvidence> find(String hash) {
		try {
			FilterEvidence found = GSON.fromJson(Files.readString(file(hash)), FilterEvidence.class);
			return Optional.ofNullable(found).filter(read -> read.hash().equals(hash) && isWhole(read));
		} catch (IOException | RuntimeException e) {
			return Optional.empty(); // not there, or damaged in whatever way: it is computed again, and then replaced
		}
	}

	// Not forced to disk: a file that a crash left empty counts as not there.
	@Override
	public void put(FilterEvidence found) throws IOException {
		Files.createDirectories(present);
		ignoreInVersionControl();
		Path temporary = Files.createTempFile(present, ".", ".tmp");
		try {
			Files.writeString(temporary, GSON.toJson(found));
			Files.move(temporary, file(found.hash()), StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
		} finally {
			Files.deleteIfExists(temporary);
		}
	}

	@Override
	public void retain(Set<String> hashes) throws IOException {
		for (Path version : list(evidence)) {
			for (Path file : list(version)) {
				if (!version.equals(present) || !hashes.contains(hash(file))) {
					Files.deleteIfExists(file);
				}
			}
			if (!version.equals(present)) {
				Files.delete(version);
			}
		}
	}

	private static List<Path> list(Path folder) throws IOException {
		try (Stream<Path> files = Files.list(folder)) {
			return files.toList();
		} catch (NoSuchFileException e) {
			return List.of();
		} catch (UncheckedIOException e) {
			throw e.getCause();
		}
	}

	private void ignoreInVersionControl() throws IOException {
		Path ignore = derived.resolve(".gitignore");
		if (!Files.exists(ignore)) {
			Files.writeString(ignore, "*\n");
		}
	}

	private Path file(String hash) {
		return present.resolve(hash + EXTENSION);
	}

	private static String hash(Path file) {
		String name = file.getFileName().toString();
		return name.endsWith(EXTENSION) ? name.substring(0, name.length() - EXTENSION.length()) : "";
	}

	// A file that misses a part reads as null there.
	private static boolean isWhole(FilterEvidence read) {
		return read.name() != null && read.requirements().stream().allMatch(requirement -> requirement.severity() != null
				&& requirement.proof() != null && requirement.proof().verdict() != null && requirement.proof().value() != null
				&& requirement.proof().margin() != null && requirement.proof().note() != null && requirement.id() != null
				&& requirement.kind() != null && requirement.description() != null && requirement.valueUnit() != null
				&& requirement.placeUnit() != null);
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.core.architecture;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.jar.Attributes;
import java.util.jar.Manifest;
import java.util.regex.Pattern;

/** The files of the checkout that the tests run in. */
final class Checkout {

	private static final Set<String> NOT_OURS = Set.of(".git", "target", "bin", ".metadata", ".tapwright");
	private static final Set<String> BINARY = Set.of("png", "gif", "ico", "icns", "jar", "wav");

	/** Splits a manifest header at the commas between its entries, not at those within quotes. */
	private static final Pattern BETWEEN_ENTRIES = Pattern.compile(",(?=(?:[^\"]*\"[^\"]*\")*[^\"]*$)");

	private final Path root;

	Checkout() {
		var folder = Path.of("").toAbsolutePath();
		while (!Files.exists(folder.resolve("bundles/tapwright.core"))) {
			folder = folder.getParent();
		}
		root = folder;
	}

	/** Symbolic names of all bundles, which are the names of their folders. */
	Set<String> bundles() throws IOException {
		try (var folders = Files.list(root.resolve("bundles"))) {
			var names = new TreeSet<String>();
			folders.filter(folder -> Files.exists(folder.resolve("META-INF/MANIFEST.MF")))
					.forEach(folder -> names.add(folder.getFileName().toString()));
			return names;
		}
	}

	/** The names in a header of a bundle's manifest, without attributes and directives; empty without the header. */
	Set<String> header(String bundle, String header) throws IOException {
		var names = new TreeSet<String>();
		var value = attributes(bundle).getValue(header);
		if (value != null) {
			for (var entry : BETWEEN_ENTRIES.split(value)) {
				names.add(entry.strip().split(";", 2)[0]);
			}
		}
		return names;
	}

	private Attributes attributes(String bundle) throws IOException {
		try (var in = Files.newInputStream(root.resolve("bundles").resolve(bundle).resolve("META-INF/MANIFEST.MF"))) {
			return new Manifest(in).getMainAttributes();
		}
	}

	/** All text files below a folder, generated and built ones left out where a build puts them. */
	List<Path> texts(String folder) throws IOException {
		try (var files = Files.walk(root.resolve(folder))) {
			return files.filter(Files::isRegularFile).filter(this::isOurs).sorted().toList();
		}
	}

	/** The Java sources that a bundle ships, written by hand. */
	List<Path> sources(String bundle) throws IOException {
		var src = "bundles/" + bundle + "/src";
		if (!Files.exists(root.resolve(src))) {
			return List.of();
		}
		return texts(src).stream().filter(file -> file.toString().endsWith(".java")).toList();
	}

	/** The path below the checkout, with slashes. */
	String name(Path file) {
		return root.relativize(file).toString().replace('\\', '/');
	}

	static String read(Path file) throws IOException {
		return new String(Files.readAllBytes(file), StandardCharsets.UTF_8);
	}

	private boolean isOurs(Path file) {
		for (var part : root.relativize(file)) {
			if (NOT_OURS.contains(part.toString()) || part.toString().startsWith(".polyglot")) {
				return false;
			}
		}
		var name = file.getFileName().toString();
		return !BINARY.contains(name.substring(name.lastIndexOf('.') + 1));
	}
}

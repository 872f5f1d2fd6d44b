// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.nio.file.attribute.PosixFilePermissions;

/** Adds files so that a reader, or a crash, finds the whole file or none, and so that nothing that exists is ever replaced. */
final class AddedFiles {

	private AddedFiles() {
	}

	/**
	 * Writes a temporary file in the same folder, forces it to disk and gives it its name. Missing folders are made.
	 *
	 * @throws FileAlreadyExistsException
	 *             when there is a file of that name, be it made by another process at the same moment; it is unchanged
	 */
	static void add(Path file, byte[] content) throws IOException {
		Path folder = file.toAbsolutePath().getParent();
		Files.createDirectories(folder);
		Path temporary = Files.createTempFile(folder, ".", ".tmp");
		try {
			try (FileChannel channel = FileChannel.open(temporary, StandardOpenOption.WRITE)) {
				ByteBuffer buffer = ByteBuffer.wrap(content);
				while (buffer.hasRemaining()) {
					channel.write(buffer);
				}
				channel.force(true);
			}
			if (Files.getFileAttributeView(temporary, PosixFileAttributeView.class) != null) {
				Files.setPosixFilePermissions(temporary, PosixFilePermissions.fromString("rw-r--r--"));
			}
			name(temporary, file);
		} finally {
			Files.deleteIfExists(temporary);
		}
	}

	// A link fails when the name is taken, whoever took it; a rename would replace. Where the file system has no links, the name is
	// first claimed by an empty file, which only one process can make; a crash just then leaves that file, which reads as damaged.
	private static void name(Path temporary, Path file) throws IOException {
		try {
			Files.createLink(file, temporary);
		} catch (FileAlreadyExistsException e) {
			throw e;
		} catch (UnsupportedOperationException | FileSystemException e) {
			Files.createFile(file);
			Files.move(temporary, file, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
		}
	}
}

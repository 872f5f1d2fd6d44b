// SPDX-License-Identifier: EPL-2.0
package tapwright.model.io;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.nio.file.attribute.PosixFilePermissions;

/** Writes files so that a reader, or a crash, finds the old content or the new, never a part. */
public final class AtomicFiles {

	private AtomicFiles() {
	}

	/**
	 * Writes a temporary file in the same folder, forces it to disk and renames it over the target. Missing folders are made.
	 *
	 * @throws IOException
	 *             when any step fails; the target is then unchanged
	 */
	public static void write(Path file, byte[] content) throws IOException {
		Path target = file.toAbsolutePath();
		Files.createDirectories(target.getParent());
		Path temporary = Files.createTempFile(target.getParent(), "." + target.getFileName() + ".", ".tmp");
		try {
			try (FileChannel channel = FileChannel.open(temporary, StandardOpenOption.WRITE)) {
				ByteBuffer buffer = ByteBuffer.wrap(content);
				while (buffer.hasRemaining()) {
					channel.write(buffer);
				}
				channel.force(true);
			}
			keepPermissions(target, temporary);
			Files.move(temporary, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
		} finally {
			Files.deleteIfExists(temporary);
		}
	}

	// Temporary files are private to their owner; the target keeps, or gets, what files usually have.
	private static void keepPermissions(Path target, Path temporary) throws IOException {
		if (Files.getFileAttributeView(temporary, PosixFileAttributeView.class) == null) {
			return;
		}
		Files.setPosixFilePermissions(temporary, Files.exists(target) ? Files.getPosixFilePermissions(target)
				: PosixFilePermissions.fromString("rw-r--r--"));
	}
}

// SPDX-License-Identifier: EPL-2.0
package tapwright.core.history;

import java.nio.file.Files;
import java.nio.file.Path;

import tapwright.model.Revision;

/** Times the listing, with all checks, of 10,000 revisions of one filter. A program, not a test. */
public final class ListingBenchmark {

	private static final int REVISIONS = 10_000;

	private ListingBenchmark() {
	}

	public static void main(String[] args) throws Exception {
		Path folder = Files.createTempDirectory("revisions");
		var store = new RevisionStore(folder);
		String parent = null;
		for (int k = 1; k <= REVISIONS; k++) {
			Revision revision = RecordingProcess.revision("owner", k);
			if (parent != null) {
				revision.getParents().add(parent);
			}
			parent = store.add(revision, k).hash();
		}
		for (int round = 0; round < 5; round++) {
			long start = System.nanoTime();
			int count = store.read().graph().revisions().size();
			System.out.printf("%d revisions in %d ms%n", count, (System.nanoTime() - start) / 1_000_000);
		}
	}
}

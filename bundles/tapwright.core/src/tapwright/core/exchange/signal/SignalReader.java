// SPDX-License-Identifier: EPL-2.0
package tapwright.core.exchange.signal;

import java.io.Closeable;
import java.io.IOException;
import java.util.OptionalDouble;

import tapwright.core.InputException;

/** Reads a signal from front to back. Integers are exact, since no file has longer ones than a double holds. */
interface SignalReader extends Closeable {

	/** Samples at one moment. */
	int channels();

	/** Hertz, when the file says. */
	OptionalDouble sampleRate();

	/** Bits of samples that are integers of full scale; 0 when samples are numbers as they are. */
	int fullScaleBits();

	/** Whether samples are real numbers with full scale 1. */
	boolean isNormalised();

	/**
	 * Reads the next moments.
	 *
	 * @param block
	 *            a row for each channel
	 * @return how many were read; 0 at the end
	 * @throws InputException
	 *             with the place of what is no number
	 */
	int read(double[][] block) throws InputException, IOException;
}

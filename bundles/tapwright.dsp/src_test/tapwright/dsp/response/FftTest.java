// SPDX-License-Identifier: EPL-2.0
package tapwright.dsp.response;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.Random;

import org.junit.jupiter.api.Test;

import tapwright.dsp.verify.OracleMath;

/** The transform against the defining sum in decimal arithmetic, and its bound against its errors. */
class FftTest {

	@Test
	void everyOutputIsWithinItsBound() {
		Random random = new Random(2);
		for (int size : new int[] { 4, 8, 16, 32, 64 }) {
			BigDecimal[] cos = new BigDecimal[size];
			for (int k = 0; k < size; k++) {
				cos[k] = OracleMath.cos(OracleMath.PI.multiply(BigDecimal.valueOf(2L * k))
						.divide(BigDecimal.valueOf(size), OracleMath.DIGITS));
				assertEquals(cos[k].doubleValue(), Fft.cos(k, size), 3 * 0x1p-53);
			}
			Fft fft = Fft.ofSize(size);
			double[] re = random.doubles(size, -1, 1).toArray();
			double[] im = random.doubles(size, -1, 1).toArray();
			double[] outRe = re.clone();
			double[] outIm = im.clone();
			fft.transform(outRe, outIm);
			double sum = 0;
			for (int k = 0; k < size; k++) {
				sum += Math.hypot(re[k], im[k]);
			}
			for (int f = 0; f < size; f++) {
				BigDecimal trueRe = BigDecimal.ZERO;
				BigDecimal trueIm = BigDecimal.ZERO;
				for (int k = 0; k < size; k++) {
					BigDecimal c = cos[f * k % size];
					BigDecimal s = cos[Math.floorMod(f * k - size / 4, size)].negate();
					BigDecimal r = new BigDecimal(re[k]);
					BigDecimal i = new BigDecimal(im[k]);
					trueRe = trueRe.add(r.multiply(c)).subtract(i.multiply(s));
					trueIm = trueIm.add(r.multiply(s)).add(i.multiply(c));
				}
				double error = Math.hypot(trueRe.subtract(new BigDecimal(outRe[fft.position(f)])).doubleValue(),
						trueIm.subtract(new BigDecimal(outIm[fft.position(f)])).doubleValue());
				assertTrue(error <= fft.errorFactor() * sum, "size " + size + " output " + f + " error " + error);
			}
		}
	}

	@Test
	void sizesOtherThanPowersOfTwoAreRefused() {
		assertThrows(IllegalArgumentException.class, () -> Fft.ofSize(12));
		assertThrows(IllegalArgumentException.class, () -> Fft.ofSize(2));
	}
}

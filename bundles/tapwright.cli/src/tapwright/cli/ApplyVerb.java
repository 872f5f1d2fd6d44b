// SPDX-License-Identifier: EPL-2.0
package tapwright.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

import tapwright.core.InputException;
import tapwright.core.exchange.signal.SignalRun;
import tapwright.core.portfolio.FilterSource;
import tapwright.core.portfolio.Sources;
import tapwright.core.verify.FilterQuestion;
import tapwright.dsp.verify.Subject;
import tapwright.model.Filter;

/** Runs a filter over a signal in a file. */
final class ApplyVerb implements Verb {

	@Override
	public String name() {
		return "apply";
	}

	@Override
	public String summary() {
		return "runs a filter over a signal in a file";
	}

	@Override
	public String help() {
		return """
				usage: tapwright apply FILE --input SIGNAL --output SIGNAL

				FILE is a NAME.filter or an interchange JSON file. Signals are .wav (PCM of 8 to 32 bits, floating point), .csv or
				.txt (a line for each moment, a column for each channel), .raw or .bin (one channel, lowest byte first), of any
				length. Each channel is filtered by itself.

				A filter with input and output formats runs bit for bit: samples of a WAV file are placed at the full scale of the
				input format; numbers in other files are integers of that format. Without both formats it runs in double
				precision, and raw files hold doubles.

				  --input SIGNAL   what to filter
				  --output SIGNAL  where to write the result; replaced when it exists

				examples:
				  tapwright apply marram/strain-antialias.filter --input recording.wav --output filtered.wav
				  tapwright apply marram/wave-lowpass.filter --input waves.csv --output smooth.csv

				exit codes: 0 done; 2 bad usage or input, nothing was written""";
	}

	@Override
	public List<Option> options() {
		return List.of(new Option("--input", true), new Option("--output", true));
	}

	@Override
	public int run(Arguments arguments, Console console) throws InputException, IOException {
		if (arguments.operands().size() != 1 || !arguments.has("--input") || !arguments.has("--output")) {
			throw new InputException("", "give one file, --input and --output; 'tapwright apply --help' has examples");
		}
		Path file = VerifyVerb.path(arguments.operands().getFirst());
		List<FilterSource> sources = Sources.read(List.of(file));
		if (sources.size() != 1) {
			throw new InputException(file.toString(), "holds " + sources.size() + " filters; give one file");
		}
		FilterSource source = sources.getFirst();
		Filter filter = source.filter().orElseThrow(() -> new InputException("", source.problem()));
		Subject subject = FilterQuestion.of(filter, source.parameters(), source.partners()).subject()
				.orElseThrow(() -> new InputException(file.toString(),
						"has no usable coefficients; 'tapwright verify' says why"));
		Path output = VerifyVerb.path(arguments.option("--output").orElseThrow());
		SignalRun run;
		try (var progress = new TerminalProgress(console)) {
			run = SignalRun.of(subject, VerifyVerb.path(arguments.option("--input").orElseThrow()), output, progress);
		}
		console.out().println(output + ": " + run.outputs() + " samples from " + run.moments()
				+ (run.exact() ? ", bit for bit" : ", in double precision"));
		return Main.OK;
	}
}

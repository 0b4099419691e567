package org.notchwork.strategy.quantum;

import java.util.List;
import java.util.Optional;
import org.notchwork.engine.Noise;
import org.notchwork.json.Fault;
import org.notchwork.json.Fields;
import org.notchwork.json.Spelling;
import org.notchwork.strategy.Strategy;
import org.notchwork.strategy.StrategyForm;
import org.notchwork.strategy.quantum.decoder.Decoder;
import org.notchwork.strategy.quantum.decoder.Elimination;
import org.notchwork.strategy.quantum.decoder.Likelihood;
import org.notchwork.strategy.quantum.decoder.PooledElimination;

/**
 * Reads {@code fourier-sampling-fixed}: either {@code rounds} (m) or {@code extra-rounds} (m − n + 1), and {@code decoder}:
 * {@code elimination} (the default), {@code likelihood} or {@code pooled-elimination}.
 */
public final class FourierSamplingFixedForm implements StrategyForm {

    private static final int MOST = 100_000;
    private static final int DRAWS = 200;

    @Override
    public String name() {
        return FourierSamplingFixed.NAME;
    }

    @Override
    public Strategy configure(Fields settings, Noise noise) {
        return new FourierSamplingFixed(rounds(settings), decoder(settings, noise));
    }

    private static Rounds rounds(Fields settings) {
        boolean isExtra = settings.has("extra-rounds");
        if (isExtra == settings.has("rounds")) {
            settings.faults()
                    .add(new Fault(
                            settings.pointer(),
                            isExtra
                                    ? "\"rounds\" and \"extra-rounds\" at once"
                                    : "a fixed number of rounds without the number",
                            "either \"rounds\" or \"extra-rounds\" (beyond n - 1) is wanted"));
            return new Rounds(false, 1);
        }
        return new Rounds(isExtra, (int) settings.integer(isExtra ? "extra-rounds" : "rounds", isExtra ? 0 : 1, MOST));
    }

    private static Decoder decoder(Fields settings, Noise noise) {
        List<Decoder> decoders = List.of(new Elimination(), new Likelihood(noise), new PooledElimination(DRAWS));
        Optional<String> word = settings.optionalText("decoder", 1, 40).filter(w -> !w.isEmpty());
        if (word.isEmpty()) {
            return decoders.get(0);
        }
        List<String> names = decoders.stream().map(Decoder::name).toList();
        if (!names.contains(word.get())) {
            settings.fault("decoder", "no decoder " + Fields.quoted(word.get()), Spelling.mend(word.get(), names));
            return decoders.get(0);
        }
        return decoders.get(names.indexOf(word.get()));
    }
}

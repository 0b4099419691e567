package org.notchwork.study;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import org.notchwork.catalogue.Engines;
import org.notchwork.catalogue.Strategies;
import org.notchwork.engine.Engine;
import org.notchwork.engine.Noise;
import org.notchwork.exact.Decimals;
import org.notchwork.json.Fields;
import org.notchwork.json.Spelling;
import org.notchwork.problem.Problem;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.strategy.Strategy;

/** Reads one strategy of an experiment and refuses combinations that cannot run. */
final class StrategyReader {

    /** The word for an engine that is not named. */
    static final String AUTO = "auto";

    private static final Pattern LABEL = Pattern.compile("[a-z0-9]([a-z0-9-]{0,38}[a-z0-9])?");
    private static final String LABEL_MEND = "1 to 40 lower-case letters, digits and inner hyphens are wanted";
    private static final String PROBABILITY_MEND = "a probability in quotes is wanted, for example \"0.02\"";
    private static final BigDecimal HALF = new BigDecimal("0.5");

    private final Optional<Problem> problem;
    private final List<Integer> widths;
    private final EngineChoice engines;

    StrategyReader(Optional<Problem> problem, List<Integer> widths) {
        this.problem = problem;
        this.widths = widths;
        this.engines = new EngineChoice(problem, widths);
    }

    /** Returns the choice; empty if faults were noted. */
    Optional<StrategyChoice> read(Fields.Item item) {
        Fields fields = item.object();
        int before = fields.faults().size();
        Noise noise = fields.optionalObject("noise").map(StrategyReader::noise).orElse(Noise.NONE);
        Optional<Strategy> strategy = strategy(fields, noise);
        Optional<String> label = fields.optionalText("label", LABEL, LABEL_MEND);
        Optional<Boolean> control = fields.optionalTruth("control");
        boolean allowsSighted = fields.optionalTruth("allow-sighted").orElse(false);
        boolean auto = isAuto(fields);
        Optional<Engine> engine = auto ? Optional.empty() : engine(fields, strategy);
        fields.end();
        strategy.ifPresent(s -> fit(fields, s, engine, noise));
        if (allowsSighted && !auto) {
            fields.fault("allow-sighted", "an engine is named", "this goes with \"engine\": \"auto\" only");
        }
        if (fields.faults().size() > before || strategy.isEmpty()) {
            return Optional.empty();
        }
        if (!auto) {
            return Optional.of(
                    new StrategyChoice(strategy.get(), engine, StrategyChoice.Asked.BY_NAME, label, noise, control));
        }
        return engines.strongest(fields, (QuantumStrategy) strategy.get(), allowsSighted)
                .map(chosen -> new StrategyChoice(
                        strategy.get(),
                        Optional.of(chosen),
                        allowsSighted ? StrategyChoice.Asked.AUTO_OR_SIGHTED : StrategyChoice.Asked.AUTO,
                        label,
                        noise,
                        control));
    }

    private static boolean isAuto(Fields fields) {
        return fields.has("engine")
                && fields.optionalText("engine", 1, 60).filter(AUTO::equals).isPresent();
    }

    private static Noise noise(Fields fields) {
        BigDecimal flip = probability(fields, "readout-flip");
        BigDecimal mix = probability(fields, "uniform-mix");
        fields.end();
        if (flip.compareTo(HALF) == 0) {
            fields.fault(
                    "readout-flip",
                    "a bit that is flipped with probability 1/2 holds no information",
                    "less is wanted");
            return Noise.NONE;
        }
        if (flip.compareTo(HALF) > 0) {
            fields.fault(
                    "readout-flip", "p = " + flip + " is above 1/2", "1 - p with every bit inverted says the same");
            return Noise.NONE;
        }
        if (mix.compareTo(BigDecimal.ONE) >= 0) {
            fields.fault(
                    "uniform-mix", "q = " + mix + ": a uniform word holds no information", "less than 1 is wanted");
            return Noise.NONE;
        }
        return new Noise(flip, mix);
    }

    private static BigDecimal probability(Fields fields, String name) {
        Optional<String> text =
                fields.optionalText(name, Decimals.FORM, PROBABILITY_MEND).filter(t -> !t.isEmpty());
        if (text.isEmpty()) {
            return BigDecimal.ZERO;
        }
        BigDecimal value = new BigDecimal(text.get());
        if (value.signum() < 0) {
            fields.fault(name, text.get(), PROBABILITY_MEND);
            return BigDecimal.ZERO;
        }
        return value;
    }

    private static Optional<Strategy> strategy(Fields fields, Noise noise) {
        String name = fields.text("name", 1, 60);
        if (name.isEmpty()) {
            return Optional.empty();
        }
        return Strategies.form(name).map(form -> form.configure(fields, noise)).or(() -> {
            fields.fault("name", "no strategy " + Fields.quoted(name), Spelling.mend(name, Strategies.names()));
            return Optional.empty();
        });
    }

    /** Returns the engine; one that an unknown strategy names is checked for itself. */
    private static Optional<Engine> engine(Fields fields, Optional<Strategy> strategy) {
        boolean classical =
                strategy.filter(s -> !(s instanceof QuantumStrategy)).isPresent();
        if (classical && fields.has("engine")) {
            fields.fault("engine", strategy.get().name() + " is a classical strategy", "leave the engine out");
            return Optional.empty();
        }
        if (strategy.isPresent() && !classical && !fields.has("engine")) {
            String engines = String.join(", ", Engines.names());
            String mend =
                    strategy.get().name() + " is a quantum strategy; " + AUTO + " or one of " + engines + " is wanted";
            fields.fault("engine", "this member is missing", mend);
            return Optional.empty();
        }
        Optional<String> name = fields.optionalText("engine", 1, 60).filter(n -> !n.isEmpty());
        Optional<Engine> engine = name.flatMap(Engines::engine);
        if (name.isPresent() && engine.isEmpty()) {
            fields.fault(
                    "engine", "no engine " + Fields.quoted(name.get()), Spelling.mend(name.get(), Engines.names()));
        }
        return engine;
    }

    private void fit(Fields fields, Strategy strategy, Optional<Engine> engine, Noise noise) {
        if (!noise.isNone() && !(strategy instanceof QuantumStrategy quantum && quantum.bearsNoise())) {
            fields.fault(
                    "noise",
                    strategy.name() + " relies on undisturbed values",
                    "noise goes with fourier-sampling-fixed and a decoder");
        }
        if (fields.has("engine") && !(strategy instanceof QuantumStrategy) && engine.isEmpty() && isAuto(fields)) {
            fields.fault("engine", strategy.name() + " is a classical strategy", "leave the engine out");
        }
        problem.ifPresent(p -> {
            for (int width : widths) {
                Optional<String> refused = strategy.refusal(p, width);
                refused.ifPresent(why -> fields.fault("name", why, "another strategy or problem is wanted"));
                Optional<String> unreachable = strategy instanceof QuantumStrategy quantum
                        ? engine.flatMap(e -> e.refusal(p, width, quantum.circuit()))
                        : Optional.empty();
                unreachable.ifPresent(
                        why -> fields.fault("engine", why, "a smaller width or another engine is wanted"));
                if (refused.isPresent() || unreachable.isPresent()) {
                    return;
                }
            }
        });
    }
}

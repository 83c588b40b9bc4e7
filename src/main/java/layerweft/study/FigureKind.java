package layerweft.study;

import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Collectors;
import layerweft.figures.Figure;
import layerweft.figures.LayerFigures;
import layerweft.model.Finding;
import layerweft.model.InadmissibleException;

/** The figures of a layer that a study can follow while something else is varied. */
public enum FigureKind {
    EXPECTED_LOSS("expectedLoss", "expected loss", Measured.IN_MONEY, true, LayerFigures::expectedLoss),
    STANDARD_DEVIATION("standardDeviation", "standard deviation", Measured.IN_MONEY, false, LayerFigures::standardDeviation),
    LOSS_ON_LINE("lossOnLine", "loss on line", Measured.AS_PART, false, LayerFigures::lossOnLine),
    ATTACHMENT_PROBABILITY("attachmentProbability", "attachment probability", Measured.AS_PART, false, LayerFigures::attachmentProbability),
    EXHAUSTION_PROBABILITY("exhaustionProbability", "exhaustion probability", Measured.AS_PART, false, LayerFigures::exhaustionProbability),
    EXPECTED_EVENTS("expectedEvents", "events a year", Measured.PLAINLY, false, LayerFigures::expectedEvents),
    PAID_UP_FACTOR("paidUpFactor", "paid-up factor", Measured.PLAINLY, false, LayerFigures::paidUpFactor),
    NET_PREMIUM("netPremium", "expected loss and loading", Measured.IN_MONEY, true, LayerFigures::netPremium),
    TECHNICAL_PREMIUM("technicalPremium", "technical premium", Measured.IN_MONEY, true, LayerFigures::technicalPremium),
    TECHNICAL_RATE_ON_LINE("technicalRateOnLine", "technical rate on line", Measured.AS_PART, false, LayerFigures::technicalRateOnLine),
    VALUE_AT_RISK("valueAtRisk", "value at risk at the highest level asked for", Measured.IN_MONEY, false,
            f -> f.valueAtRisk().get(f.valueAtRisk().lastKey())),
    TAIL_VALUE_AT_RISK("tailValueAtRisk", "tail value at risk", Measured.IN_MONEY, false, LayerFigures::tailValueAtRisk);

    /** What the number is in. */
    public enum Measured {
        /** The portfolio's unit, at the layer's share. */
        IN_MONEY,
        /** A part of 1, shown in percent. */
        AS_PART,
        /** A number without a unit. */
        PLAINLY
    }

    private final String label;
    private final String words;
    private final Measured measured;
    private final boolean additive;
    private final Function<LayerFigures, Figure> of;

    FigureKind(String label, String words, Measured measured, boolean additive, Function<LayerFigures, Figure> of) {
        this.label = label;
        this.words = words;
        this.measured = measured;
        this.additive = additive;
        this.of = of;
    }

    /**
     * Reads {@code expectedLoss}, {@code lossOnLine}, …
     *
     * @throws InadmissibleException naming the field {@code figure}
     */
    public static FigureKind parse(String text) {
        return Arrays.stream(values()).filter(kind -> kind.label.equals(text)).findFirst()
                .orElseThrow(() -> new InadmissibleException(List.of(new Finding("figure", "\"" + text + "\"", "one of "
                        + Arrays.stream(values()).map(FigureKind::label).collect(Collectors.joining(", "))))));
    }

    /** As written in files and on the command line. */
    public String label() {
        return label;
    }

    /** As said to a reader. */
    public String words() {
        return words;
    }

    public Measured measured() {
        return measured;
    }

    /** Whether the figures of a programme's layers may be added. */
    public boolean additive() {
        return additive;
    }

    /** The figure of a layer. */
    public Figure of(LayerFigures figures) {
        return of.apply(figures);
    }

    /** The figure of a programme: the sum over its layers, for an {@link #additive} figure. */
    public Figure sum(List<LayerFigures> layers) {
        return layers.stream().map(of).reduce(Figure.exact(0), Figure::plus);
    }
}

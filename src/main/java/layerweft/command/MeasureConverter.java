package layerweft.command;

import java.util.Arrays;
import java.util.stream.Collectors;
import layerweft.study.BreakEven;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Reads {@code expectedCost} or {@code costOfRisk}. */
final class MeasureConverter implements ITypeConverter<BreakEven.Measure> {

    @Override
    public BreakEven.Measure convert(String text) {
        return Arrays.stream(BreakEven.Measure.values()).filter(m -> m.label().equals(text)).findFirst().orElseThrow(() ->
                new TypeConversionException("found \"" + text + "\"; admissible: one of "
                        + Arrays.stream(BreakEven.Measure.values()).map(BreakEven.Measure::label).collect(Collectors.joining(", "))));
    }
}

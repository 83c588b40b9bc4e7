package layerweft.reference;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;
import layerweft.model.treaty.LayerTerms;

/**
 * The Danish fire losses of 1980 to 1990, in millions of kroner at 1985 values, each of at least 1 million (Copenhagen Reinsurance; McNeil
 * 1997; Embrechts, Klüppelberg &amp; Mikosch 1997). {@code SOURCES.md} beside the data says where they come from and under which licence.
 */
final class DanishFireLosses {
    static final int YEARS = 11;
    /** Losses counted by McNeil (1997), from memory; the data have 2,167. */
    static final int COUNTED = 2156;
    private final SortedMap<Integer, List<Double>> byYear;

    private DanishFireLosses(SortedMap<Integer, List<Double>> byYear) {
        this.byYear = byYear;
    }

    static DanishFireLosses read() {
        var stream = DanishFireLosses.class.getResourceAsStream("/reference/data/danishuni.csv");
        try (CsvReader<NamedCsvRecord> csv = CsvReader.builder().ofNamedCsvRecord(new InputStreamReader(stream, StandardCharsets.UTF_8))) {
            return new DanishFireLosses(csv.stream().collect(Collectors.groupingBy(r -> Integer.valueOf(r.getField("Date").substring(0, 4)),
                    TreeMap::new, Collectors.mapping(r -> Double.valueOf(r.getField("Loss")), Collectors.toList()))));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    double[] all() {
        return byYear.values().stream().flatMap(List::stream).mapToDouble(Double::doubleValue).toArray();
    }

    SortedMap<Integer, List<Double>> byYear() {
        return byYear;
    }

    /** What the terms would have paid in a year, on average over the years of the data. */
    double burningCost(LayerTerms terms) {
        return byYear.values().stream().mapToDouble(losses -> terms.annualLoss(losses.stream().mapToDouble(terms::occurrenceLoss).sum())).average()
                .orElseThrow();
    }
}

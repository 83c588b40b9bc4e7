package layerweft.engine.transform;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.DoubleStream;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;

/**
 * A layer made ready for one portfolio and any copula: the perils that can reach it, their event laws, the lattice.
 *
 * @param perils indices in the portfolio of the perils that can reach the layer, rising
 * @param events their event laws
 * @param moments of these laws
 * @param meanCounts E[N_i]
 * @param cutCounts probability left out where counts are cut
 */
record PreparedLayer(LayerTerms terms, int[] perils, List<EventLaw> events, EventMoments[] moments, double[] meanCounts, double cutCounts,
        LayerLattice lattice) {

    /** P(o &gt; 0), E[o] and E[o²] of one event. */
    record EventMoments(double hitChance, double mean, double secondMoment) {}


    static PreparedLayer of(Treaty treaty, int layer, Accuracy accuracy) {
        LayerTerms terms = treaty.layer(layer).terms();
        double end = terms.deductible() + terms.annualLimit();
        double cap = Math.min(terms.occurrenceLimit(), end);
        List<Integer> perils = new ArrayList<>();
        List<EventLaw> events = new ArrayList<>();
        double top = Double.isInfinite(cap) ? openCap(treaty, layer, terms) : cap;
        for (int i = 0; i < treaty.portfolio().perils().size(); i++) {
            if (!treaty.cover(layer).covers(i)) {
                continue;
            }
            Peril peril = treaty.portfolio().perils().get(i);
            EventLaw event = event(treaty, layer, i, terms, top);
            if (peril.frequency().mean() > 0 && event.hitChance() > 0) {
                perils.add(i);
                events.add(event);
            }
        }
        double[] means = perils.stream().mapToDouble(i -> treaty.portfolio().perils().get(i).frequency().mean()).toArray();
        double reach = Double.isInfinite(end) ? openEnd(treaty, perils, events, terms, top) : end;
        double[] bends = DoubleStream.of(terms.deductible(), end).filter(x -> x > 0 && x < Double.POSITIVE_INFINITY).toArray();
        LayerLattice lattice = new LayerLattice(events, top, reach, bends);
        EventMoments[] moments = events.stream().map(e -> new EventMoments(e.hitChance(), e.mean(), e.secondMoment())).toArray(EventMoments[]::new);
        double cut = accuracy.ofCounts() * perils.size();
        return new PreparedLayer(terms, perils.stream().mapToInt(Integer::intValue).toArray(), events, moments, means, cut, lattice);
    }

    private static EventLaw event(Treaty treaty, int layer, int i, LayerTerms terms, double cap) {
        EventLoss loss = treaty.portfolio().perils().get(i).eventLoss();
        if (loss instanceof EventLoss.Single single) {
            return new SingleEvent(single.severity(), terms, cap);
        }
        EventLoss.Split parts = (EventLoss.Split) loss;
        boolean[] covered = new boolean[parts.subPerils().size()];
        for (int k = 0; k < covered.length; k++) {
            covered[k] = treaty.cover(layer).covers(i, k);
        }
        return SplitEvent.of(parts, covered, terms, cap);
    }

    /** Without any limit: an amount that a year's largest event passes with a chance well below those of the levels asked for. */
    private static double openCap(Treaty treaty, int layer, LayerTerms terms) {
        double rarest = 1 - treaty.programme().buyer().levels().stream().mapToDouble(Double::doubleValue).max().orElse(0.99);
        double chance = Math.min(1e-5, rarest / 50);
        double top = Math.max(terms.deductible(), 1e-9);
        for (int i = 0; i < treaty.portfolio().perils().size(); i++) {
            if (treaty.cover(layer).covers(i)) {
                Peril peril = treaty.portfolio().perils().get(i);
                double perEvent = Math.min(0.5, chance / Math.max(1e-300, peril.frequency().mean()));
                top = Math.max(top, terms.quotaShare() * largest(peril.eventLoss(), perEvent));
            }
        }
        return top;
    }

    private static double largest(EventLoss loss, double chance) {
        return loss instanceof EventLoss.Single single ? single.severity().survivalQuantile(chance)
                : ((EventLoss.Split) loss).subPerils().stream().mapToDouble(s -> s.severity().survivalQuantile(Math.min(0.5, chance / s.chance()))).sum();
    }

    /** Without an annual limit: twelve standard deviations, added peril by peril, above the mean, and some events more. */
    private static double openEnd(Treaty treaty, List<Integer> perils, List<EventLaw> events, LayerTerms terms, double cap) {
        double end = 0;
        for (int k = 0; k < perils.size(); k++) {
            FrequencyModel frequency = treaty.portfolio().perils().get(perils.get(k)).frequency();
            double[] survival = events.get(k).cellSurvival(cap / 256, 256);
            double mean = 0;
            double square = 0;
            for (int j = 0; j < 256; j++) {
                mean += survival[j] * cap / 256;
                square += survival[j] * (2 * j + 1) * cap * cap / 65_536;
            }
            double variance = frequency.mean() * square + (frequency.variance() - frequency.mean()) * mean * mean;
            end += frequency.mean() * mean + 12 * Math.sqrt(Math.max(0, variance));
        }
        return Math.max(terms.deductible(), 0) + end + 4 * cap;
    }

    /**
     * How much an error of 1 in every joint probability of counts can move the mean annual sum: by Abel summation the largest count
     * times the mean of one event, peril by peril.
     */
    double weightOfCounts() {
        double weight = 0;
        for (int i = 0; i < meanCounts.length; i++) {
            weight += (meanCounts[i] + 12 * Math.sqrt(meanCounts[i]) + 12) * Math.min(moments[i].mean(), events.get(i).cap());
        }
        return weight;
    }

    /** P(an event hits) by peril, above 0. */
    double[] hitChances() {
        return events.stream().mapToDouble(EventLaw::hitChance).toArray();
    }

    /** Error of E[A] where the means of events are not known in closed form. */
    double meanError() {
        double error = 0;
        for (int i = 0; i < meanCounts.length; i++) {
            error += meanCounts[i] * events.get(i).meanError();
        }
        return error;
    }

    /** The largest loss of one event that the lattices keep. */
    double cap() {
        return events.stream().mapToDouble(EventLaw::cap).max().orElse(0);
    }

    /** Expected number of losses above the cap where it stands for no limit at all: no less than the chance of one; NaN for sums of parts. */
    double capPassed() {
        double passed = 0;
        for (int i = 0; i < meanCounts.length && Double.isInfinite(terms.occurrenceLimit()); i++) {
            passed += events.get(i) instanceof SplitEvent ? Double.NaN : meanCounts[i] * events.get(i).survival(cap());
        }
        return passed;
    }

    /** Error of the perils' chances to hit or exhaust, over a year. */
    double chanceError() {
        double error = 0;
        for (int i = 0; i < meanCounts.length; i++) {
            error += meanCounts[i] * events.get(i).chanceError();
        }
        return error;
    }
}

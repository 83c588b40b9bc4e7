package layerweft.engine.simulation;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.severity.SeverityModel;
import layerweft.model.treaty.Cover;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.LayerTerms;
import layerweft.model.treaty.Treaty;

/**
 * What is known exactly of a layer before anything is simulated: E[A] = Σ E[N_i]·E[o_i], the mean of the year's sum of occurrence
 * losses, whatever the dependence; and the expected number of events that hit. E[A] serves as control variate.
 *
 * @param mean E[A] at 100 %, possibly infinite; NaN where not known in closed form (inuring, or several sub-perils in one event whose mean is finite)
 * @param finiteVariance whether A is known to have a finite variance
 * @param events expected number of events a year with an occurrence loss above 0; NaN where not known
 */
record OccurrenceMoments(double mean, boolean finiteVariance, double events) {

    private static final OccurrenceMoments UNKNOWN = new OccurrenceMoments(Double.NaN, true, Double.NaN);

    /** Whether E[A] can serve as control variate. */
    boolean controls() {
        return mean < Double.POSITIVE_INFINITY && finiteVariance;
    }

    static OccurrenceMoments of(Treaty treaty, int layer) {
        Layer agreed = treaty.layer(layer);
        if (!agreed.inuring().isEmpty()) {
            return UNKNOWN;
        }
        LayerTerms terms = agreed.terms();
        double mean = 0;
        double events = 0;
        boolean finiteVariance = true;
        for (int i = 0; i < treaty.portfolio().perils().size(); i++) {
            if (!treaty.cover(layer).covers(i)) {
                continue;
            }
            Peril peril = treaty.portfolio().perils().get(i);
            SubPeril part = onlyPart(peril, treaty.cover(layer), i);
            if (part == null) {
                return severalParts(treaty, layer);
            }
            FrequencyModel n = peril.frequency();
            double eventsOfPart = n.mean() * part.chance();
            mean += eventsOfPart * meanOccurrence(terms, part.severity());
            events += eventsOfPart * part.severity().survival(attaches(terms));
            finiteVariance &= terms.occurrenceLimit() < Double.POSITIVE_INFINITY
                    || part.severity().limitedSecondMoment(Double.POSITIVE_INFINITY) < Double.POSITIVE_INFINITY;
        }
        return new OccurrenceMoments(mean, finiteVariance, events);
    }

    /** Where an event can bring several covered losses, only whether moments are infinite is known. */
    private static OccurrenceMoments severalParts(Treaty treaty, int layer) {
        if (treaty.layer(layer).terms().occurrenceLimit() < Double.POSITIVE_INFINITY) {
            return UNKNOWN;
        }
        List<SeverityModel> covered = new ArrayList<>();
        for (int i = 0; i < treaty.portfolio().perils().size(); i++) {
            EventLoss loss = treaty.portfolio().perils().get(i).eventLoss();
            if (loss instanceof EventLoss.Single single && treaty.cover(layer).covers(i)) {
                covered.add(single.severity());
            } else if (loss instanceof EventLoss.Split split) {
                for (int k = 0; k < split.subPerils().size(); k++) {
                    if (treaty.cover(layer).covers(i, k)) {
                        covered.add(split.subPerils().get(k).severity());
                    }
                }
            }
        }
        boolean infiniteMean = covered.stream().anyMatch(x -> x.mean() == Double.POSITIVE_INFINITY);
        boolean infiniteVariance = covered.stream().anyMatch(x -> x.limitedSecondMoment(Double.POSITIVE_INFINITY) == Double.POSITIVE_INFINITY);
        return new OccurrenceMoments(infiniteMean ? Double.POSITIVE_INFINITY : Double.NaN, !infiniteVariance, Double.NaN);
    }

    /** The one part of the peril's event loss that is covered, or null if several are. */
    private static SubPeril onlyPart(Peril peril, Cover cover, int i) {
        if (peril.eventLoss() instanceof EventLoss.Single single) {
            return new SubPeril(peril.name(), 1, single.severity());
        }
        SubPeril only = null;
        EventLoss.Split split = (EventLoss.Split) peril.eventLoss();
        for (int k = 0; k < split.subPerils().size(); k++) {
            if (cover.covers(i, k)) {
                if (only != null) {
                    return null;
                }
                only = split.subPerils().get(k);
            }
        }
        return only;
    }

    /** The ground-up loss above which o is positive. */
    private static double attaches(LayerTerms terms) {
        return (terms.hasFranchise() ? terms.franchise() : terms.retention()) / terms.quotaShare();
    }

    /** E[o(X)] from limited expected values. */
    private static double meanOccurrence(LayerTerms terms, SeverityModel x) {
        double q = terms.quotaShare();
        double limit = terms.occurrenceLimit();
        if (!terms.hasFranchise()) {
            return q * x.layerMean(terms.retention() / q, (terms.retention() + limit) / q);
        }
        double f = terms.franchise();
        double passes = x.survival(f / q);
        return limit <= f ? limit * passes : q * x.layerMean(f / q, limit / q) + f * passes;
    }
}

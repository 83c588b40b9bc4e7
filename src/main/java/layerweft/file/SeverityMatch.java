package layerweft.file;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import layerweft.file.KindTable.Match;
import layerweft.model.InadmissibleException;
import layerweft.model.severity.Beta;
import layerweft.model.severity.Capped;
import layerweft.model.severity.DiscreteLosses;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Gamma;
import layerweft.model.severity.GeneralizedPareto;
import layerweft.model.severity.InverseGaussian;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Mixture;
import layerweft.model.severity.Pareto;
import layerweft.model.severity.SeverityModel;
import layerweft.model.severity.Spliced;

/**
 * Losses of another kind with the same mean and standard deviation, before the cap; where the kind cannot have both, with the same mean,
 * and where that is infinite, with the same mean as capped or the same median. The cap stays.
 */
final class SeverityMatch {
    /** The part of the losses that a tail put on a body takes over. */
    private static final double TAIL = 0.1;
    /** The most losses that are listed to keep a standard deviation. */
    private static final int MOST_LOSSES = 1_000;

    private SeverityMatch() {}

    static Match<SeverityModel> to(SeverityModel from, String kind) {
        SeverityModel law = SeverityMapping.uncapped(from);
        Double cap = SeverityMapping.cap(from);
        if (kind.equals("mixture")) {
            return new Match<>(capped(new Mixture(List.of(0.5, 0.5), List.of(law, law)), cap), "The same law, as a mixture of itself in equal parts.");
        }
        SeverityModel same = sameLaw(law, kind);
        if (same != null) {
            return new Match<>(capped(same, cap), "The same law.");
        }
        SeverityModel target = target(law, kind, cap);
        if (cap != null && !(target.quantile(0) < cap)) {
            return new Match<>(target, figures(law, target) + " The cap of " + Shown.number(cap) + " would be below every loss and is left out.");
        }
        String kept = cap != null && Double.isInfinite(law.mean()) ? figures(from, capped(target, cap)) + " Both are of the losses as capped."
                : figures(law, target);
        return new Match<>(capped(target, cap), kept + (cap == null ? "" : " The cap, " + Shown.number(cap) + ", is kept."));
    }

    /** What one model has of another. */
    static String compare(SeverityModel from, SeverityModel to) {
        boolean same = Shown.same(from.mean(), to.mean()) && Shown.same(deviation(from), deviation(to))
                && Shown.same(from.quantile(0.5), to.quantile(0.5));
        return same ? "The same in other parameters." : figures(from, to);
    }

    private static SeverityModel capped(SeverityModel model, Double cap) {
        return cap == null ? model : new Capped(model, cap);
    }

    private static String figures(SeverityModel from, SeverityModel to) {
        String median = Shown.same(from.mean(), to.mean()) ? "" : Shown.kept("median", from.quantile(0.5), to.quantile(0.5)) + " ";
        return median + Shown.kept("mean", from.mean(), to.mean()) + " " + Shown.kept("standard deviation", deviation(from), deviation(to));
    }

    /** σ(X), infinite where it is. */
    static double deviation(SeverityModel model) {
        double mean = model.mean();
        double second = model.limitedSecondMoment(Double.POSITIVE_INFINITY);
        return Double.isInfinite(second) ? second : Math.sqrt(Math.max(0, second - mean * mean));
    }

    /** Where one kind is a case of the other; null where it is not. */
    private static SeverityModel sameLaw(SeverityModel law, String kind) {
        if (law instanceof Pareto pareto && kind.equals("generalizedPareto")) {
            return new GeneralizedPareto(pareto.threshold(), pareto.threshold() / pareto.alpha(), 1 / pareto.alpha());
        }
        if (law instanceof GeneralizedPareto general && kind.equals("pareto") && general.threshold() > 0
                && Shown.same(general.scale(), general.shape() * general.threshold())) {
            return new Pareto(general.threshold(), 1 / general.shape());
        }
        boolean listed = law instanceof DiscreteLosses losses
                && (kind.equals("discrete") || kind.equals("empirical") && DiscreteLosses.ofEquallyLikely(losses.losses()).equals(losses));
        return listed ? law : null;
    }

    private static SeverityModel target(SeverityModel law, String kind, Double cap) {
        double mean = Shown.tidy(law.mean());
        double cv = Shown.tidy(deviation(law) / mean);
        if (kind.equals("spliced")) {
            return spliced(law);
        }
        if (Double.isFinite(mean) && Double.isFinite(cv) && cv > 0) {
            try {
                SeverityModel both = ofMeanAndCv(kind, mean, cv, law);
                if (both != null) {
                    return both;
                }
            } catch (InadmissibleException e) {
                // so extreme a spread is beyond the kind's parameters
                return Scaled.of(kind).ofMean(mean);
            }
        }
        if (Double.isFinite(mean)) {
            return Scaled.of(kind).ofMean(mean);
        }
        return cap == null ? Scaled.of(kind).ofMedian(Shown.tidy(law.quantile(0.5)))
                : Scaled.of(kind).ofCappedMean(Shown.tidy(law.limitedMean(cap)), cap);
    }

    /** Null where the kind cannot have both. */
    private static SeverityModel ofMeanAndCv(String kind, double mean, double cv, SeverityModel law) {
        return switch (kind) {
            case "lognormal" -> Lognormal.ofMeanAndCv(mean, cv);
            case "gamma" -> Gamma.ofMeanAndCv(mean, cv);
            case "pareto" -> pareto(mean, cv);
            case "generalizedPareto" -> generalizedPareto(mean, cv, law.quantile(0));
            case "inverseGaussian" -> new InverseGaussian(mean, mean / (cv * cv));
            case "exponential" -> new Exponential(mean);
            case "beta" -> beta(mean, cv, law.upperEnd());
            case "discrete" -> new DiscreteLosses(List.of(low(mean, cv), high(mean, cv)), List.of(1 - 1 / count(cv), 1 / count(cv)));
            case "empirical" -> count(cv) > MOST_LOSSES ? null : DiscreteLosses.ofEquallyLikely(losses(mean, cv));
            default -> Scaled.of(kind).ofMeanAndCv(mean, cv);
        };
    }

    /** cv² = 1/(α(α − 2)), mean = threshold·α/(α − 1). */
    private static SeverityModel pareto(double mean, double cv) {
        double alpha = 1 + Math.sqrt(1 + 1 / (cv * cv));
        return new Pareto(mean * (alpha - 1) / alpha, alpha);
    }

    /** The excess over the threshold, which stays, has mean σ/(1 − ξ) and squared coefficient of variation 1/(1 − 2ξ). */
    private static SeverityModel generalizedPareto(double mean, double cv, double smallest) {
        double threshold = smallest < mean ? Math.max(0, smallest) : 0;
        double excess = mean - threshold;
        double ratio = excess / (cv * mean);
        double shape = (1 - ratio * ratio) / 2;
        return new GeneralizedPareto(threshold, excess * (1 - shape), shape);
    }

    /** Up to the largest loss there was; where that is infinite or too near, up to an amount that leaves room. */
    private static SeverityModel beta(double mean, double cv, double largest) {
        double room = mean * (1 + cv * cv);
        double end = Double.isFinite(largest) && largest > room ? largest : Shown.tidy(Math.max(10 * mean, 2 * room));
        double part = mean / end;
        double total = (1 - part) / (part * cv * cv) - 1;
        return new Beta(part * total, (1 - part) * total, end);
    }

    /** Low losses and one high one. */
    private static List<Double> losses(double mean, double cv) {
        List<Double> losses = new ArrayList<>(Collections.nCopies((int) count(cv) - 1, low(mean, cv)));
        losses.add(high(mean, cv));
        return losses;
    }

    /** The least n such that n losses, all but one of them alike, can have that coefficient of variation: cv² ≤ n − 1. */
    private static double count(double cv) {
        return 1 + Math.max(1, Math.ceil(cv * cv));
    }

    /** The alike ones stand cv/√(n − 1) of the mean below it, … */
    private static double low(double mean, double cv) {
        return Math.max(0, mean * (1 - cv / Math.sqrt(count(cv) - 1)));
    }

    /** … the other cv·√(n − 1) above. */
    private static double high(double mean, double cv) {
        return mean * (1 + cv * Math.sqrt(count(cv) - 1));
    }

    /** The law as the body, and above its 90 % point a Pareto tail with the mean of its losses there, or the heaviest common one. */
    private static SeverityModel spliced(SeverityModel law) {
        double threshold = Shown.tidy(law.survivalQuantile(TAIL));
        double weight = Shown.tidy(law.survival(threshold));
        double excess = weight > 0 ? law.layerMean(threshold, Double.POSITIVE_INFINITY) / weight : 0;
        double alpha = Double.isFinite(excess) && excess > 0 ? 1 + threshold / excess : excess > 0 ? 1 : 2;
        boolean split = weight > 0 && weight < 1 && law.cdf(threshold) > 0;
        return split ? new Spliced(law, threshold, new Pareto(threshold, alpha), weight)
                : new Spliced(new Exponential(Math.max(threshold, Double.MIN_NORMAL)), threshold, new Pareto(threshold, alpha), TAIL);
    }
}

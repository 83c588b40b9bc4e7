package layerweft.model.treaty;

/**
 * A layer's terms as arithmetic on plain numbers, at 100 %: the one place where terms are applied, for the simulation, for the
 * transform's lattice and for a burning cost. Symbols are those of the trade: subject loss s, quota share q, retention R or franchise F,
 * occurrence limit L, occurrence loss o; annual sum A, deductible D, annual limit M, layer loss Y.
 *
 * <p>Order of terms (common practice, no source): quota share, then franchise or retention and limit of each event, then the annual
 * deductible, the annual limit last.
 */
public final class LayerTerms {
    private final double quotaShare;
    private final double retention;
    private final double franchise;
    private final double occurrenceLimit;
    private final double deductible;
    private final double annualLimit;
    private final double[] rates;

    private LayerTerms(double quotaShare, OccurrenceTerms occurrence, double deductible, double annualLimit, double[] rates) {
        this.quotaShare = quotaShare;
        this.retention = occurrence.retention();
        this.franchise = occurrence.franchise() == null ? Double.NaN : occurrence.franchise();
        this.occurrenceLimit = occurrence.limit();
        this.deductible = deductible;
        this.annualLimit = annualLimit;
        this.rates = rates;
    }

    static LayerTerms of(Layer layer) {
        double limit = layer.annual().limit();
        double[] rates = new double[0];
        if (layer.reinstatements() != null) {
            rates = layer.reinstatements().stream().mapToDouble(Double::doubleValue).toArray();
            limit = Math.min(limit, (rates.length + 1) * layer.occurrence().limit());
        }
        return new LayerTerms(layer.quotaShare(), layer.occurrence(), layer.annual().deductible(), limit, rates);
    }

    /** q, in (0, 1]. */
    public double quotaShare() {
        return quotaShare;
    }

    /** R, 0 where there is a franchise. */
    public double retention() {
        return retention;
    }

    public boolean hasFranchise() {
        return !Double.isNaN(franchise);
    }

    /** F, NaN where there is none. */
    public double franchise() {
        return franchise;
    }

    /** L, possibly infinite. */
    public double occurrenceLimit() {
        return occurrenceLimit;
    }

    /** D. */
    public double deductible() {
        return deductible;
    }

    /** M, possibly infinite: the annual limit, or (n + 1)·L with n reinstatements if that is smaller. */
    public double annualLimit() {
        return annualLimit;
    }

    /** What a rate on line is measured by: L, or M where there is no occurrence limit; infinite where there is neither. */
    public double line() {
        return occurrenceLimit < Double.POSITIVE_INFINITY ? occurrenceLimit : annualLimit;
    }

    /** Whether the year's sum matters at all: a deductible or an annual limit. */
    public boolean hasAnnualTerms() {
        return deductible > 0 || annualLimit < Double.POSITIVE_INFINITY;
    }

    /** Whether one event alone, as the first of its year, recovers its whole occurrence loss. */
    public boolean firstEventInFull() {
        return deductible == 0 && annualLimit >= occurrenceLimit;
    }

    public int reinstatements() {
        return rates.length;
    }

    /** c_k, the premium rate of reinstatement k = 1..n. */
    public double reinstatementRate(int k) {
        return rates[k - 1];
    }

    /** Whether any reinstatement is paid for. */
    public boolean hasPaidReinstatements() {
        for (double c : rates) {
            if (c > 0) {
                return true;
            }
        }
        return false;
    }

    /** o(s): the occurrence loss of a subject loss s ≥ 0, before quota share. */
    public double occurrenceLoss(double subject) {
        double s = quotaShare * subject;
        if (hasFranchise()) {
            return s > franchise ? Math.min(s, occurrenceLimit) : 0;
        }
        return Math.min(Math.max(s - retention, 0), occurrenceLimit);
    }

    /** {@link #occurrenceLoss} of the first {@code n} subject losses, into {@code out}: a loop that compilers turn into vector instructions. */
    public void occurrenceLosses(double[] subject, int n, double[] out) {
        if (hasFranchise()) {
            for (int k = 0; k < n; k++) {
                out[k] = occurrenceLoss(subject[k]);
            }
            return;
        }
        double q = quotaShare;
        double r = retention;
        double l = occurrenceLimit;
        for (int k = 0; k < n; k++) {
            out[k] = Math.min(Math.max(q * subject[k] - r, 0), l);
        }
    }

    /** Y = min(max(A − D, 0), M): the layer loss of an annual sum A of occurrence losses; the cumulated recovery C_k of a part of the year. */
    public double annualLoss(double sum) {
        return Math.min(Math.max(sum - deductible, 0), annualLimit);
    }

    /**
     * u_k = min(max(Y − (k−1)·L, 0), L)/L: the used part of reinstatement k = 1..n, pro rata as to amount (Sundt 1991, "On excess of
     * loss reinsurance with reinstatements", Bulletin of the Swiss Association of Actuaries).
     */
    public double reinstated(int k, double layerLoss) {
        return Math.min(Math.max(layerLoss - (k - 1) * occurrenceLimit, 0), occurrenceLimit) / occurrenceLimit;
    }

    /** Σ c_k·u_k: reinstatement premium of a year, as a multiple of the upfront premium, 100 % as to time. */
    public double reinstatementFactor(double layerLoss) {
        double sum = 0;
        for (int k = 1; k <= rates.length; k++) {
            sum += rates[k - 1] * reinstated(k, layerLoss);
        }
        return sum;
    }
}

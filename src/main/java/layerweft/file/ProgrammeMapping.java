package layerweft.file;

import static layerweft.file.Field.number;
import static layerweft.file.Field.optional;
import static layerweft.file.Field.required;

import java.util.ArrayList;
import java.util.List;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;

/** The objects of a programme file, with what holds where a field is left out. */
final class ProgrammeMapping {
    static final String FORMAT = "layerweft/programme/1";

    private static final Field<String> NAME = required("name", Scalars.TEXT);
    private static final TwoWay<List<String>> NAMES = Lists.of(Scalars.TEXT, Limits.LIST);

    private static final Field<Double> LIMIT = number("limit", Double.POSITIVE_INFINITY);
    private static final Shape<OccurrenceTerms> OCCURRENCE = Shape.of("occurrence",
            Variant.of(number("retention", 0.0).of(ProgrammeMapping::retention), LIMIT.of(OccurrenceTerms::limit),
                    (retention, limit) -> new OccurrenceTerms(retention, null, limit)),
            Variant.of(number("franchise").of(OccurrenceTerms::franchise), LIMIT.of(OccurrenceTerms::limit),
                    (franchise, limit) -> new OccurrenceTerms(0, franchise, limit)));
    private static final Shape<AnnualTerms> ANNUAL = Shape.of("annual",
            Variant.of(number("deductible", 0.0).of(AnnualTerms::deductible), LIMIT.of(AnnualTerms::limit), AnnualTerms::new));

    private static final Field<List<String>> PERILS =
            optional("perils", Lists.notEmpty(NAMES, "at least one name, or no such field: all perils"), List.of());
    private static final Field<OccurrenceTerms> LAYER_OCCURRENCE = optional("occurrence", OCCURRENCE, OccurrenceTerms.NONE);
    private static final Field<AnnualTerms> LAYER_ANNUAL = optional("annual", ANNUAL, AnnualTerms.NONE);
    private static final Field<List<Double>> REINSTATEMENTS = optional("reinstatements", Lists.of(Scalars.NUMBER, Limits.LIST), null);
    private static final Field<Double> QUOTA_SHARE = number("quotaShare", 1.0);
    private static final Field<Double> SHARE = number("share", 1.0);
    private static final Field<Boolean> PRO_RATA_TIME = optional("proRataTime", Scalars.TRUTH, false);
    private static final Field<List<String>> INURING = optional("inuring", Lists.distinct(NAMES), List.of());
    private static final Field<Double> PREMIUM = number("premium", null);
    private static final Shape<Layer> LAYER = Shape.of("layer", Variant.of(
            v -> new Layer(v.get(NAME), v.get(PERILS), v.get(LAYER_OCCURRENCE), v.get(LAYER_ANNUAL), v.get(REINSTATEMENTS), v.get(QUOTA_SHARE),
                    v.get(SHARE), v.get(PRO_RATA_TIME), v.get(INURING), v.get(PREMIUM)),
            NAME.of(Layer::name), PERILS.of(Layer::perils), LAYER_OCCURRENCE.of(Layer::occurrence), LAYER_ANNUAL.of(Layer::annual),
            REINSTATEMENTS.of(Layer::reinstatements), QUOTA_SHARE.of(Layer::quotaShare), SHARE.of(Layer::share),
            PRO_RATA_TIME.of(Layer::proRataTime), INURING.of(Layer::inuring), PREMIUM.of(Layer::premium)));

    private static final Field<Loading> LOADING = optional("loading", LoadingMapping.LOADING, Pricing.PLAIN.loading());
    private static final Field<Boolean> BROKERAGE_ON_REINSTATEMENTS =
            optional("brokerageOnReinstatements", Scalars.TRUTH, Pricing.PLAIN.brokerageOnReinstatements());
    private static final Shape<Pricing> PRICING = Shape.of("pricing", Variant.of(LOADING.of(Pricing::loading),
            number("brokerage", Pricing.PLAIN.brokerage()).of(Pricing::brokerage), number("expenses", Pricing.PLAIN.expenses()).of(Pricing::expenses),
            BROKERAGE_ON_REINSTATEMENTS.of(Pricing::brokerageOnReinstatements), Pricing::new));

    private static final Field<List<Double>> RETURN_PERIODS =
            optional("returnPeriods", Lists.of(Scalars.NUMBER, Limits.LIST), Buyer.USUAL.returnPeriods());
    private static final Shape<Buyer> BUYER = Shape.of("buyer", Variant.of(RETURN_PERIODS.of(Buyer::returnPeriods),
            number("tailLevel", Buyer.USUAL.tailLevel()).of(Buyer::tailLevel), number("capitalCost", Buyer.USUAL.capitalCost()).of(Buyer::capitalCost),
            Buyer::new));

    private static final Field<List<Layer>> LAYERS = required("layers", Lists.notEmpty(Lists.of(LAYER, Limits.LAYERS), "at least one layer"));
    private static final Field<Pricing> PROGRAMME_PRICING = optional("pricing", PRICING, Pricing.PLAIN);
    private static final Field<Buyer> PROGRAMME_BUYER = optional("buyer", BUYER, Buyer.USUAL);
    private static final Shape<Programme> PROGRAMME = Shape.of("programme", Variant.of(
            v -> new Programme(v.get(NAME), v.get(LAYERS), v.get(PROGRAMME_PRICING), v.get(PROGRAMME_BUYER)),
            required("format", Scalars.constant(FORMAT)).of(programme -> FORMAT), NAME.of(Programme::name), LAYERS.of(Programme::layers),
            PROGRAMME_PRICING.of(Programme::pricing), PROGRAMME_BUYER.of(Programme::buyer)));

    private ProgrammeMapping() {}

    static Programme read(Node.Members root, Faults faults) {
        return PROGRAMME.read(root, "", faults);
    }

    static Node write(Programme programme) {
        return PROGRAMME.write(programme);
    }

    /** Null where a franchise stands in its place. */
    private static Double retention(OccurrenceTerms terms) {
        return terms.franchise() == null ? terms.retention() : null;
    }

    /** The shapes of all objects of the file. */
    static List<Shape<?>> shapes() {
        List<Shape<?>> shapes = new ArrayList<>(List.of(PROGRAMME, LAYER, OCCURRENCE, ANNUAL, PRICING, BUYER));
        shapes.addAll(LoadingMapping.LOADING.shapes());
        return shapes;
    }
}

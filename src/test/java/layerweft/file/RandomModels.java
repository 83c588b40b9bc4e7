package layerweft.file;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.stream.IntStream;
import layerweft.model.copula.Archimedean;
import layerweft.model.copula.ArchimedeanFamily;
import layerweft.model.copula.Comonotonic;
import layerweft.model.copula.Copula;
import layerweft.model.copula.Countermonotonic;
import layerweft.model.copula.Gaussian;
import layerweft.model.copula.Group;
import layerweft.model.copula.GroupedArchimedean;
import layerweft.model.copula.Independence;
import layerweft.model.copula.MixtureCopula;
import layerweft.model.copula.Student;
import layerweft.model.frequency.Binomial;
import layerweft.model.frequency.EmpiricalCounts;
import layerweft.model.frequency.FrequencyModel;
import layerweft.model.frequency.NegativeBinomial;
import layerweft.model.frequency.Poisson;
import layerweft.model.portfolio.Dependence;
import layerweft.model.portfolio.EventLoss;
import layerweft.model.portfolio.Peril;
import layerweft.model.portfolio.Portfolio;
import layerweft.model.portfolio.SubPeril;
import layerweft.model.severity.Beta;
import layerweft.model.severity.Burr;
import layerweft.model.severity.Capped;
import layerweft.model.severity.DiscreteLosses;
import layerweft.model.severity.Exponential;
import layerweft.model.severity.Gamma;
import layerweft.model.severity.GeneralizedPareto;
import layerweft.model.severity.InverseGaussian;
import layerweft.model.severity.Loglogistic;
import layerweft.model.severity.Lognormal;
import layerweft.model.severity.Mbbefd;
import layerweft.model.severity.Mixture;
import layerweft.model.severity.Pareto;
import layerweft.model.severity.SeverityModel;
import layerweft.model.severity.Spliced;
import layerweft.model.severity.Weibull;
import layerweft.model.treaty.AnnualTerms;
import layerweft.model.treaty.Buyer;
import layerweft.model.treaty.Layer;
import layerweft.model.treaty.Loading;
import layerweft.model.treaty.OccurrenceTerms;
import layerweft.model.treaty.Pricing;
import layerweft.model.treaty.Programme;

/** Models of every kind from a seed: parameters of a few digits or of all, every optional field there or not. */
final class RandomModels {
    /** Kinds of severities, uncapped. */
    static final int SEVERITIES = 16;
    static final int FREQUENCIES = 4;
    static final int COPULAS = 12;
    static final int LOADINGS = 6;

    private final Random random;

    RandomModels(long seed) {
        random = new Random(seed);
    }

    /** Between the two, half of the time as a person would type it. */
    double number(double low, double high) {
        double value = low + (high - low) * random.nextDouble();
        double short2 = Math.round(value * 100) / 100.0;
        return random.nextBoolean() && short2 > low && short2 < high ? short2 : value;
    }

    private double amount() {
        return Math.exp(number(-3, 8));
    }

    SeverityModel severity() {
        SeverityModel model = severity(random.nextInt(SEVERITIES), 2);
        return random.nextInt(3) == 0 ? new Capped(model, model.quantile(number(0.5, 0.99)) * 1.5 + 1) : model;
    }

    SeverityModel severity(int kind, int depth) {
        return switch (depth == 0 ? kind % 12 : kind) {
            case 0 -> new Lognormal(number(-2, 5), number(0.1, 3));
            case 1 -> Lognormal.ofMeanAndCv(amount(), number(0.1, 5));
            case 2 -> new Pareto(amount(), number(0.4, 4));
            case 3 -> new GeneralizedPareto(random.nextBoolean() ? 0 : amount(), amount(), number(-0.5, 1.5));
            case 4 -> new Gamma(number(0.1, 9), amount());
            case 5 -> Gamma.ofMeanAndCv(amount(), number(0.1, 3));
            case 6 -> new Weibull(number(0.3, 3), amount());
            case 7 -> new Burr(number(0.5, 3), number(0.5, 3), amount());
            case 8 -> new Loglogistic(number(0.5, 4), amount());
            case 9 -> new Exponential(amount());
            case 10 -> new InverseGaussian(amount(), amount());
            case 11 -> new Beta(number(0.2, 4), number(0.2, 4), amount());
            case 12 -> random.nextBoolean() ? Mbbefd.ofC(number(0, 8), amount()) : new Mbbefd(number(0.1, 5), number(1, 50), amount());
            case 13 -> discrete();
            case 14 -> new Spliced(new Gamma(number(1, 3), 10), number(5, 30), random.nextBoolean() ? new Pareto(5, number(0.8, 3))
                    : new Capped(new Exponential(amount() + 5), 1000), number(0.01, 0.9));
            default -> mixture(depth);
        };
    }

    private SeverityModel discrete() {
        List<Double> losses = IntStream.range(0, 1 + random.nextInt(9)).mapToObj(k -> amount()).toList();
        return random.nextBoolean() ? DiscreteLosses.ofEquallyLikely(losses) : new DiscreteLosses(losses, weights(losses.size()));
    }

    private Mixture mixture(int depth) {
        int n = 1 + random.nextInt(4);
        return new Mixture(weights(n), IntStream.range(0, n).mapToObj(k -> severity(random.nextInt(SEVERITIES), depth - 1)).toList());
    }

    /** Above 0, sum 1 within rounding. */
    private List<Double> weights(int n) {
        double[] raw = IntStream.range(0, n).mapToDouble(k -> number(0.05, 1)).toArray();
        double sum = Arrays.stream(raw).sum();
        return Arrays.stream(raw).mapToObj(w -> w / sum).toList();
    }

    FrequencyModel frequency(int kind) {
        return switch (kind) {
            case 0 -> new Poisson(number(0.01, 50));
            case 1 -> new NegativeBinomial(number(0.01, 50), number(1.01, 9));
            case 2 -> new Binomial(1 + random.nextInt(500), number(0.001, 1));
            default -> new EmpiricalCounts(weights(1 + random.nextInt(12)));
        };
    }

    /** A copula that joins so many, at least 2. */
    Copula copula(int kind, int dimension) {
        double tau = number(0, 0.95);
        return switch (kind) {
            case 0 -> new Independence();
            case 1 -> new Comonotonic();
            case 2 -> dimension == 2 ? new Countermonotonic() : new Comonotonic();
            case 3 -> Gaussian.ofKendallTau(dimension == 2 ? 2 * tau - 1 : tau);
            case 4 -> Gaussian.ofCorrelation(correlation(dimension));
            case 5 -> Student.ofKendallTau(tau, number(0.2, 30));
            case 6 -> Student.ofCorrelation(correlation(dimension), number(0.2, 30));
            case 7, 8 -> Archimedean.ofKendallTau(family(), random.nextBoolean(), tau);
            case 9 -> pairOrMore(dimension);
            case 10 -> grouped(dimension);
            default -> {
                int n = 1 + random.nextInt(4);
                yield new MixtureCopula(weights(n), IntStream.range(0, n).mapToObj(k -> copula(random.nextInt(COPULAS - 1), dimension)).toList());
            }
        };
    }

    private ArchimedeanFamily family() {
        return ArchimedeanFamily.values()[random.nextInt(4)];
    }

    private Copula pairOrMore(int dimension) {
        if (dimension == 2 && random.nextBoolean()) {
            return Archimedean.ofKendallTau(random.nextBoolean() ? ArchimedeanFamily.FRANK : ArchimedeanFamily.CLAYTON, random.nextBoolean(),
                    -number(0.01, 0.9));
        }
        ArchimedeanFamily family = family();
        return Archimedean.ofTheta(family, random.nextBoolean(), family.independentTheta() + number(0.001, 9));
    }

    /** Some of the perils in groups, groups in groups. */
    private Copula grouped(int dimension) {
        ArchimedeanFamily family = family();
        List<Integer> perils = new ArrayList<>(IntStream.range(0, dimension).boxed().toList());
        Collections.shuffle(perils, random);
        double theta = strength(family, number(0, 0.2));
        int half = Math.max(1, dimension / 2);
        List<Group> groups = new ArrayList<>();
        List<Integer> first = perils.subList(0, half);
        groups.add(half > 1 ? new Group(strength(family, number(0.25, 0.5)), first.subList(0, 1),
                List.of(new Group(strength(family, number(0.6, 0.9)), first.subList(1, half), List.of())))
                : new Group(strength(family, number(0.25, 0.5)), first, List.of()));
        if (random.nextBoolean()) {
            groups.add(new Group(strength(family, number(0.25, 0.5)), perils.subList(half, dimension), List.of()));
        }
        return GroupedArchimedean.of(family, random.nextBoolean(), new Group(theta, List.of(), groups));
    }

    /** By τ or by θ itself. */
    private double strength(ArchimedeanFamily family, double tau) {
        double theta = family.thetaOf(tau);
        return random.nextBoolean() ? theta : Math.max(family.independentTheta(), Math.round(theta * 1000) / 1000.0);
    }

    /** Of one common factor with random loads, so positive definite. */
    private double[][] correlation(int d) {
        double[] load = IntStream.range(0, d).mapToDouble(i -> number(-0.95, 0.95)).toArray();
        double[][] matrix = new double[d][d];
        for (int i = 0; i < d; i++) {
            for (int j = 0; j < d; j++) {
                matrix[i][j] = i == j ? 1 : load[i] * load[j];
            }
        }
        return matrix;
    }

    Portfolio portfolio() {
        int n = 1 + random.nextInt(6);
        List<Peril> perils = IntStream.range(0, n).mapToObj(i -> new Peril("peril " + i, frequency(random.nextInt(FREQUENCIES)),
                random.nextInt(3) == 0 ? split() : new EventLoss.Single(severity()))).toList();
        Dependence.Links links = Dependence.Links.values()[random.nextInt(2)];
        Dependence dependence = n == 1 ? Dependence.NONE : new Dependence(links, copula(random.nextInt(COPULAS), n));
        return new Portfolio("Book \"é\"", "EUR", "million", perils, dependence);
    }

    private EventLoss split() {
        int n = 1 + random.nextInt(4);
        List<SubPeril> parts = IntStream.range(0, n)
                .mapToObj(k -> new SubPeril("part " + k, random.nextBoolean() ? 1 : number(0.01, 1), severity())).toList();
        return new EventLoss.Split(parts, n == 1 ? new Independence() : copula(random.nextInt(COPULAS), n));
    }

    Loading loading(int kind) {
        return switch (kind) {
            case 0 -> new Loading.None();
            case 1 -> new Loading.StandardDeviation(number(0, 1));
            case 2 -> new Loading.Variance(number(0, 0.01));
            case 3 -> new Loading.CostOfCapital(number(0, 0.2), number(0.9, 0.999));
            case 4 -> new Loading.ProportionalHazard(number(1, 2));
            default -> new Loading.Wang(number(-0.2, 1));
        };
    }

    Programme programme() {
        int n = 1 + random.nextInt(5);
        List<Layer> layers = IntStream.range(0, n).mapToObj(this::layer).toList();
        Pricing pricing = random.nextInt(4) == 0 ? Pricing.PLAIN
                : new Pricing(loading(random.nextInt(LOADINGS)), number(0, 0.3), number(0, 0.3), random.nextBoolean());
        Buyer buyer = random.nextInt(4) == 0 ? Buyer.USUAL
                : new Buyer(List.of(number(2, 50), number(51, 999)), number(0.5, 0.999), number(0, 0.2));
        return new Programme("Cover", layers, pricing, buyer);
    }

    private Layer layer(int k) {
        double limit = random.nextInt(4) == 0 ? Double.POSITIVE_INFINITY : amount();
        OccurrenceTerms occurrence = switch (random.nextInt(4)) {
            case 0 -> OccurrenceTerms.NONE;
            case 1 -> new OccurrenceTerms(0, random.nextBoolean() ? 0 : amount(), limit);
            default -> new OccurrenceTerms(random.nextInt(4) == 0 ? 0 : amount(), null, limit);
        };
        AnnualTerms annual = random.nextBoolean() ? AnnualTerms.NONE
                : new AnnualTerms(random.nextBoolean() ? 0 : amount(), random.nextBoolean() ? amount() : Double.POSITIVE_INFINITY);
        boolean limited = occurrence.limit() < Double.POSITIVE_INFINITY && annual.limit() == Double.POSITIVE_INFINITY;
        List<Double> rates = !limited || random.nextBoolean() ? null
                : IntStream.range(0, random.nextInt(4)).mapToObj(r -> number(0, 1.5)).toList();
        return new Layer("layer " + k, random.nextBoolean() ? List.of() : List.of("peril 0", "peril 1/part 0"), occurrence, annual, rates,
                random.nextBoolean() ? 1 : number(0.1, 1), random.nextBoolean() ? 1 : number(0.1, 1), rates != null && random.nextBoolean(),
                k > 0 && random.nextBoolean() ? List.of("layer " + random.nextInt(k)) : List.of(), random.nextBoolean() ? null : (Double) amount());
    }
}

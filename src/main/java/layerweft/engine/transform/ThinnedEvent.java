package layerweft.engine.transform;

import java.util.Arrays;

/** An event law that brings a loss with a chance only, and nothing otherwise. */
record ThinnedEvent(EventLaw law, double chance) implements EventLaw {

    @Override
    public double cap() {
        return law.cap();
    }

    @Override
    public double hitChance() {
        return chance * law.hitChance();
    }

    @Override
    public double fullChance() {
        return chance * law.fullChance();
    }

    @Override
    public double chanceError() {
        return chance * law.chanceError();
    }

    @Override
    public double mean() {
        return chance * law.mean();
    }

    @Override
    public double meanError() {
        return chance * law.meanError();
    }

    @Override
    public double secondMoment() {
        return chance * law.secondMoment();
    }

    @Override
    public double survival(double x) {
        return chance * law.survival(x);
    }

    @Override
    public double[] cellSurvival(double step, int cells) {
        return thinned(law.cellSurvival(step, cells));
    }

    @Override
    public boolean secondOrder() {
        return law.secondOrder();
    }

    @Override
    public OrderedLaws ordered(double step, int cells) {
        return law.ordered(step, cells).thinned(chance);
    }

    @Override
    public double[] atoms(double step, int cells) {
        double[] atoms = law.atoms(step, cells);
        if (atoms == null) {
            return null;
        }
        double[] thinned = thinned(atoms);
        thinned[0] += 1 - chance;
        return thinned;
    }

    @Override
    public double[] landmarks() {
        return law.landmarks();
    }

    private double[] thinned(double[] values) {
        return Arrays.stream(values).map(v -> v * chance).toArray();
    }
}

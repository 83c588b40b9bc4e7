package layerweft.engine.simulation;

/** Sums over years of what each peril brings of an annual amount, in all years and in those from a threshold on. */
final class PerilSums {
    final double[] all;
    final double[] bad;
    long years;
    long badYears;

    PerilSums(int perils) {
        all = new double[perils];
        bad = new double[perils];
    }

    /**
     * @param whole the annual amounts
     * @param parts peril × year, adding up to them
     */
    void add(double[] whole, double[][] parts, int count, double threshold) {
        years += count;
        for (int y = 0; y < count; y++) {
            boolean isBad = whole[y] >= threshold;
            badYears += isBad ? 1 : 0;
            for (int i = 0; i < all.length; i++) {
                all[i] += parts[i][y];
                bad[i] += isBad ? parts[i][y] : 0;
            }
        }
    }

    void add(PerilSums other) {
        years += other.years;
        badYears += other.badYears;
        for (int i = 0; i < all.length; i++) {
            all[i] += other.all[i];
            bad[i] += other.bad[i];
        }
    }

    /** Mean part, mean part in bad years, share, share in bad years: 4 × peril. */
    double[][] figures() {
        double[][] figures = new double[4][all.length];
        double whole = 0;
        double wholeBad = 0;
        for (int i = 0; i < all.length; i++) {
            whole += all[i];
            wholeBad += bad[i];
        }
        for (int i = 0; i < all.length; i++) {
            figures[0][i] = all[i] / years;
            figures[1][i] = badYears == 0 ? Double.NaN : bad[i] / badYears;
            figures[2][i] = whole == 0 ? Double.NaN : all[i] / whole;
            figures[3][i] = wholeBad == 0 ? Double.NaN : bad[i] / wholeBad;
        }
        return figures;
    }
}

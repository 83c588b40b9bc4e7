package layerweft.desktop.strip;

import java.util.Locale;

/** τ in writing. */
final class TauText {

    private TauText() {}

    /** Two decimals. */
    static String rounded(double tau) {
        return of(Math.rint(tau * 100) / 100);
    }

    /** Two decimals, three where the third is not 0; a true minus. */
    static String of(double tau) {
        double thousandths = Math.rint(tau * 1000);
        boolean fine = Math.abs(thousandths - 10 * Math.rint(thousandths / 10)) > 0.5;
        String digits = String.format(Locale.ROOT, fine ? "%.3f" : "%.2f", Math.abs(tau));
        return (thousandths < 0 ? "−" : "") + digits;
    }
}

package layerweft.desktop.picture;

/**
 * The lines of equal height on a grid by marching squares (Lorensen &amp; Cline 1987 in the plane): each cell is crossed by straight pieces between the
 * points of its edges where the height, linear along the edge, is met. At a saddle the mean of the corners decides.
 */
final class Contours {

    /** Takes one piece, in nodes of the grid. */
    @FunctionalInterface
    interface Pieces {
        void piece(double x1, double y1, double x2, double y2);
    }

    private Contours() {}

    static void trace(DensityGrid grid, double height, Pieces out) {
        for (int j = 0; j < DensityGrid.SIZE - 1; j++) {
            for (int i = 0; i < DensityGrid.SIZE - 1; i++) {
                cell(grid.at(i, j), grid.at(i + 1, j), grid.at(i + 1, j + 1), grid.at(i, j + 1), height, i, j, out);
            }
        }
    }

    /** Corners a, b, c, d counterclockwise from the lower left. */
    private static void cell(double a, double b, double c, double d, double h, int i, int j, Pieces out) {
        int above = (a >= h ? 1 : 0) + (b >= h ? 2 : 0) + (c >= h ? 4 : 0) + (d >= h ? 8 : 0);
        if (above == 0 || above == 15) {
            return;
        }
        double below = i + part(a, b, h);
        double right = j + part(b, c, h);
        double over = i + part(d, c, h);
        double left = j + part(a, d, h);
        boolean highMiddle = (a + b + c + d) / 4 >= h;
        switch (above) {
            case 1, 14 -> out.piece(below, j, i, left);
            case 2, 13 -> out.piece(below, j, i + 1, right);
            case 4, 11 -> out.piece(i + 1, right, over, j + 1);
            case 8, 7 -> out.piece(i, left, over, j + 1);
            case 3, 12 -> out.piece(i, left, i + 1, right);
            case 6, 9 -> out.piece(below, j, over, j + 1);
            default -> {
                boolean joined = above == 5 == highMiddle;
                out.piece(below, j, joined ? i + 1 : i, joined ? right : left);
                out.piece(over, j + 1, joined ? i : i + 1, joined ? left : right);
            }
        }
    }

    private static double part(double from, double to, double height) {
        return (height - from) / (to - from);
    }
}

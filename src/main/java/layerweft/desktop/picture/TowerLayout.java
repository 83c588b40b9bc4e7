package layerweft.desktop.picture;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Where everything of a tower stands on a sheet. Layers that overlap stand side by side in lanes of their own.
 *
 * @param scale of amounts, shared by all columns
 * @param threadsLeft left edge of the box of threads
 * @param pitch width of a full limit with the gap after it
 * @param blocks layers of each event
 * @param covers of the year's total, in the column at the right
 * @param columnLeft left edge of that column; NaN where there is none
 */
record TowerLayout(double width, double height, AmountScale scale, TowerThreads threads, double threadsLeft, double pitch, List<Block> blocks,
        List<Block> covers, double columnLeft) {
    static final double HAZE_LEFT = 48;
    static final double HAZE_WIDTH = 46;
    static final double COLUMN_WIDTH = 104;
    /** Lower blocks carry their number beside them. */
    static final double SMALL = 20;
    /** Blocks are drawn no lower than this. */
    static final double LEAST = 4;

    private static final double THREADS_LEFT = 172;
    private static final double ABOVE = 62;
    private static final double ABOVE_SLANTING = 96;
    private static final double BELOW = 48;
    private static final double WIDEST = 67;
    private static final double NARROWEST = 30;
    private static final double BUNDLE = 44;
    private static final double SPINE = 18;
    private static final double SPINES_APART = 10;
    private static final double LABEL = 136;
    private static final double LEAST_LABEL = 92;

    /**
     * One layer as a block.
     *
     * @param layer position in the programme
     * @param lane 0 for those over the threads
     * @param left edge of all of it
     * @param cellsLeft edge of its first cell
     * @param right edge of its last cell
     * @param top and {@code bottom} as drawn
     * @param toScale whether it is as high as its limit says
     * @param labelWidth room for its name at the right
     */
    record Block(int layer, int lane, double left, double cellsLeft, double right, double top, double bottom, boolean toScale, double labelWidth) {

        double height() {
            return bottom - top;
        }

        double middle() {
            return (top + bottom) / 2;
        }

        boolean contains(double x, double y, double slack) {
            return x >= left - slack && x <= right + slack && y >= top - slack && y <= bottom + slack;
        }
    }

    static TowerLayout of(Tower tower, boolean log, double width, double height) {
        TowerThreads threads = TowerThreads.of(tower, width);
        return of(tower, AmountScale.of(tower, log, threads.slanting() ? ABOVE_SLANTING : ABOVE, height - BELOW), width, height);
    }

    /** On a given scale, e.g. that at the beginning of a movement. */
    static TowerLayout of(Tower tower, AmountScale scale, double width, double height) {
        TowerThreads threads = TowerThreads.of(tower, width);
        List<Integer> ofEvents = tower.positions(false);
        List<Integer> ofYear = tower.positions(true);
        List<List<Integer>> lanes = lanes(tower, ofEvents);
        double columnLeft = ofYear.isEmpty() ? Double.NaN : width - COLUMN_WIDTH;
        long spines = tower.layers().stream().filter(l -> !l.recoveredBefore().isEmpty()).count();
        double right = (ofYear.isEmpty() ? width : columnLeft - 8) - (spines == 0 ? 0 : SPINE + SPINES_APART * spines);
        double cellsLeft = THREADS_LEFT + threads.width() + (threads.size() == 0 ? 0 : 4);
        double units = 0;
        for (List<Integer> lane : lanes) {
            units += units(tower, lane);
        }
        double bundles = threads.size() == 0 ? 0 : BUNDLE * Math.max(0, lanes.size() - 1);
        double room = right - cellsLeft - bundles - 10.0 * lanes.size();
        double label = Math.max(LEAST_LABEL, Math.min(LABEL, (room - units * WIDEST) / Math.max(1, lanes.size())));
        double pitch = Math.max(NARROWEST, Math.min(WIDEST, (room - label * lanes.size()) / Math.max(1, units)));
        List<Block> blocks = new ArrayList<>();
        double x = cellsLeft;
        for (int lane = 0; lane < lanes.size(); lane++) {
            double left = lane == 0 ? THREADS_LEFT : x;
            double first = lane == 0 ? cellsLeft : x + (threads.size() == 0 ? 0 : BUNDLE);
            boolean last = lane == lanes.size() - 1;
            x = last ? right : first + pitch * units(tower, lanes.get(lane)) + 10 + label;
            for (int j : lanes.get(lane)) {
                double end = first + pitch * TowerCells.size(TowerCells.of(tower.layers().get(j))) - 2;
                blocks.add(block(tower, scale, j, lane, left, first, end, x - end - 16));
            }
        }
        List<Block> covers = new ArrayList<>();
        List<List<Integer>> stacks = lanes(tower, ofYear);
        for (int k = 0; k < stacks.size(); k++) {
            double each = COLUMN_WIDTH / stacks.size();
            for (int j : stacks.get(k)) {
                double left = columnLeft + k * each;
                covers.add(block(tower, scale, j, k, left, left, left + each, each));
            }
        }
        return new TowerLayout(width, height, scale, threads, THREADS_LEFT, pitch, blocks, covers, columnLeft);
    }

    private static Block block(Tower tower, AmountScale scale, int j, int lane, double left, double cellsLeft, double right, double label) {
        Tower.Layer layer = tower.layers().get(j);
        double top = Math.max(scale.top() - 10, scale.y(layer.top()));
        double bottom = Math.max(top, scale.y(layer.retention()));
        double gap = bottom - top > 4 * LEAST ? 1.5 : 0;
        boolean toScale = bottom - top >= LEAST;
        return new Block(j, lane, left, cellsLeft, right, toScale ? top + gap : bottom - LEAST, bottom - gap, toScale, label);
    }

    private static double units(Tower tower, List<Integer> layers) {
        return layers.stream().mapToDouble(j -> TowerCells.size(TowerCells.of(tower.layers().get(j)))).max().orElse(0);
    }

    /** Each layer in the first lane where it overlaps no other; lower layers choose first. */
    private static List<List<Integer>> lanes(Tower tower, List<Integer> layers) {
        List<List<Integer>> lanes = new ArrayList<>();
        List<Integer> upward = layers.stream().sorted(Comparator.comparingDouble((Integer j) -> tower.layers().get(j).retention())).toList();
        for (int j : upward) {
            Tower.Layer layer = tower.layers().get(j);
            List<Integer> free = null;
            for (List<Integer> lane : lanes) {
                Tower.Layer highest = tower.layers().get(lane.get(lane.size() - 1));
                if (free == null && layer.retention() >= highest.top() * (1 - 1e-9)) {
                    free = lane;
                }
            }
            if (free == null) {
                free = new ArrayList<>();
                lanes.add(free);
            }
            free.add(j);
        }
        return lanes;
    }

    /** Middle of a thread. */
    double threadX(int thread) {
        return threadsLeft + threads.apart() * (thread + 0.5);
    }

    double cellsLeft() {
        return threadsLeft + threads.width() + (threads.size() == 0 ? 0 : 4);
    }

    Block blockOf(int layer) {
        for (Block block : blocks) {
            if (block.layer() == layer) {
                return block;
            }
        }
        return covers.stream().filter(c -> c.layer() == layer).findFirst().orElseThrow();
    }

    List<Block> all() {
        List<Block> all = new ArrayList<>(blocks);
        all.addAll(covers);
        return all;
    }
}

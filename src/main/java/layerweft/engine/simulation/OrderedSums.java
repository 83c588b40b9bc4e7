package layerweft.engine.simulation;

import java.util.HashMap;
import java.util.Map;

/** Adds up blocks that finish in any order as if they had finished in theirs, so that rounding is always the same. */
final class OrderedSums {
    private final Map<Long, BlockSums> waiting = new HashMap<>();
    private BlockSums total;
    private long next;

    synchronized void add(long block, BlockSums sums) {
        waiting.put(block, sums);
        for (BlockSums ready = waiting.remove(next); ready != null; ready = waiting.remove(next)) {
            if (total == null) {
                total = ready;
            } else {
                total.add(ready);
            }
            next++;
        }
    }

    /** The sum of all blocks added, once all have been. */
    synchronized BlockSums total() {
        return total;
    }
}

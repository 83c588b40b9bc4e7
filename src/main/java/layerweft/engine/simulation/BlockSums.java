package layerweft.engine.simulation;

/** All sums of one block, or of several added up in the order of the blocks. */
final class BlockSums {
    final LayerSums[] layers;
    final PositionSums[] positions;

    BlockSums(LayerSums[] layers, PositionSums[] positions) {
        this.layers = layers;
        this.positions = positions;
    }

    void add(BlockSums o) {
        for (int j = 0; j < layers.length; j++) {
            layers[j].add(o.layers[j]);
        }
        for (int k = 0; k < positions.length; k++) {
            positions[k].add(o.positions[k]);
        }
    }
}

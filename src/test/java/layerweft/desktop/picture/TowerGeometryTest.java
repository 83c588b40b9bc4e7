package layerweft.desktop.picture;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class TowerGeometryTest {

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void heightsAndAmountsAreInverse(boolean log) {
        AmountScale scale = AmountScale.of(TowerExamples.five(), log, 60, 560);
        for (double amount : new double[] {6, 30, 90, 299}) {
            assertEquals(amount, scale.amount(scale.y(amount)), 1e-9 * amount);
        }
    }

    @Test
    void aLogarithmicAxisStartsAtHalfTheLowestRetention() {
        assertEquals(5, AmountScale.of(TowerExamples.five(), true, 60, 560).low());
    }

    @ParameterizedTest
    @CsvSource({"1,1", "1.1,2", "3,5", "7,10", "0.021,0.05", "4000,5000"})
    void stepsAreOneTwoOrFiveTimesAPowerOfTen(double size, double step) {
        assertEquals(step, AmountScale.stepOf(size));
    }

    @Test
    void atMostSevenGridLinesAboveZero() {
        for (double highest : new double[] {1, 1.3, 2.1, 4.9, 7.7, 9.9}) {
            AmountScale scale = new AmountScale(0, highest, false, 0, 500);
            assertTrue(scale.ticks().size() <= 8, highest + ": " + scale.ticks());
        }
    }

    @Test
    void cellsAreTheDeductibleThenTheLimitsOfTheYear() {
        List<TowerCells.Cell> cells = TowerCells.of(TowerExamples.odd().layers().get(2));
        assertEquals(List.of(TowerCells.Kind.KEPT, TowerCells.Kind.KEPT, TowerCells.Kind.USED, TowerCells.Kind.USED), cells.stream().map(TowerCells.Cell::kind).toList());
        assertEquals(1.6 + 1.5, TowerCells.size(cells), 1e-12);
        assertEquals(0.004 / 0.5, cells.get(3).use(), 1e-12, "use of a broken cell is a part of that cell");
    }

    @Test
    void unlimitedReinstatementsEndOpen() {
        List<TowerCells.Cell> cells = TowerCells.of(TowerExamples.odd().layers().get(0));
        assertEquals(TowerCells.Kind.OPEN, cells.get(cells.size() - 1).kind());
    }

    @Test
    void overlappingLayersStandSideBySide() {
        TowerLayout layout = TowerLayout.of(TowerExamples.odd(), false, 1100, 640);
        for (TowerLayout.Block a : layout.blocks()) {
            for (TowerLayout.Block b : layout.blocks()) {
                boolean apartAcross = a.right() < b.left() || b.right() < a.left();
                Tower.Layer one = TowerExamples.odd().layers().get(a.layer());
                Tower.Layer other = TowerExamples.odd().layers().get(b.layer());
                boolean overlap = a != b && one.retention() < other.top() && other.retention() < one.top();
                assertTrue(!overlap || apartAcross, one.name() + " on " + other.name());
            }
        }
    }

    @Test
    void aLayerTooLowToSeeKeepsFourPixelsAndIsNotToScale() {
        TowerLayout.Block hair = TowerLayout.of(TowerExamples.odd(), false, 1100, 640).blockOf(6);
        assertEquals(4, hair.height(), 1e-9);
        assertFalse(hair.toScale());
    }

    @Test
    void moreThanSixPerilsBecomeTheLargestFiveAndOthersWhereThereIsNoRoom() {
        TowerThreads threads = TowerThreads.of(TowerExamples.perils(8), 600);
        assertEquals(List.of("Freeze", "Earthquake", "Wildfire", "Surge", "Landslide", "others"), threads.threads().stream().map(TowerThreads.Strand::name).toList());
        assertEquals((1 + 2 + 3) / 36.0, threads.threads().get(5).share(TowerExamples.perils(8).layers().get(0)), 1e-12);
        assertEquals(8, TowerThreads.of(TowerExamples.perils(8), 900).size());
        assertEquals(6, TowerThreads.of(TowerExamples.perils(10), 2000).size());
        assertEquals(0, TowerThreads.of(TowerExamples.perils(1), 900).size());
    }

    @Test
    void aPileMovesAsOneAndNeverBelowZero() {
        Tower tower = TowerExamples.five();
        AmountScale scale = AmountScale.of(tower, false, 60, 560);
        List<TowerChange> changes = new TowerGrip(1, TowerGrip.Part.BODY).moved(tower, 100, 20, scale, false, true);
        assertEquals(List.of(new TowerChange(1, 50, 90), new TowerChange(0, 20, 30), new TowerChange(2, 140, 150), new TowerChange(3, 0, 20)), changes);
    }

    @Test
    void anEdgeNeverCrossesTheOtherEdgeOfItsLayer() {
        Tower tower = TowerExamples.five();
        AmountScale scale = AmountScale.of(tower, false, 60, 560);
        List<TowerChange> changes = new TowerGrip(0, TowerGrip.Part.TOP).moved(tower, 60, 5, scale, false, false);
        assertEquals(30, changes.get(0).retention());
        assertEquals(scale.step(30), changes.get(0).limit());
    }
}

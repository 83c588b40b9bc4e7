package layerweft.desktop.session;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.util.List;
import layerweft.file.FileTree;
import org.junit.jupiter.api.Test;

class LayerEditTest {
    private final FileTree tower = FileTree.parse("programme", """
            {"format": "layerweft/programme/1", "name": "Tower", "layers": [
              {"name": "First", "occurrence": {"retention": 20, "limit": 30}, "premium": 6.5},
              {"name": "Second", "inuring": ["First"], "annual": {"deductible": 10}},
              {"name": "Third", "inuring": ["First", "Second"], "annual": {"deductible": 10}}]}
            """);

    @Test
    void aNewLayerStandsOnTopOfTheSelectedOne() {
        FileTree more = LayerEdit.addedAbove(tower, 0);
        assertEquals(4, LayerEdit.count(more));
        assertEquals(50, more.number("layers[1].occurrence.retention"));
        assertEquals(30, more.number("layers[1].occurrence.limit"));
        assertEquals("Layer 4", more.text("layers[1].name"));
    }

    @Test
    void anEmptyProgrammeTakesItsFirstLayer() {
        FileTree first = LayerEdit.added(tower.remove("layers"), 0, 10, 10);
        assertEquals(1, LayerEdit.count(first));
    }

    @Test
    void aCopyHasAllFieldsAndAFreeName() {
        FileTree copied = LayerEdit.duplicated(LayerEdit.duplicated(tower, 0), 0);
        assertEquals("First copy 2", copied.text("layers[1].name"));
        assertEquals("First copy", copied.text("layers[2].name"));
        assertEquals(6.5, copied.number("layers[1].premium"));
    }

    @Test
    void aLayerThatGoesNoLongerInuresToOthers() {
        FileTree without = LayerEdit.removed(tower, 0);
        assertFalse(without.has("layers[0].inuring"));
        assertEquals(List.of("Second"), without.get("layers[1].inuring"));
    }
}

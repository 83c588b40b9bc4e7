package layerweft.desktop;

import java.io.File;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.scene.control.Alert;
import javafx.scene.control.ButtonBar.ButtonData;
import javafx.scene.control.ButtonType;
import javafx.scene.layout.Region;
import javafx.stage.FileChooser;
import javafx.stage.Window;
import layerweft.desktop.theme.Theme;

/** Dialogs of a window. */
final class WindowDialogs implements Dialogs {
    private static final FileChooser.ExtensionFilter JSON = new FileChooser.ExtensionFilter("Portfolios and programmes", "*.json");
    private static final FileChooser.ExtensionFilter ALL = new FileChooser.ExtensionFilter("All files", "*");

    private final Window owner;
    private final Theme theme;
    private File folder;

    WindowDialogs(Window owner, Theme theme) {
        this.owner = owner;
        this.theme = theme;
    }

    @Override
    public List<Path> chooseToOpen(String title) {
        List<File> chosen = chooser(title).showOpenMultipleDialog(owner);
        if (chosen == null) {
            return List.of();
        }
        folder = chosen.get(0).getParentFile();
        return chosen.stream().map(File::toPath).toList();
    }

    @Override
    public Optional<Path> chooseToSave(String title, String suggestedName) {
        FileChooser chooser = chooser(title);
        chooser.setInitialFileName(suggestedName);
        File chosen = chooser.showSaveDialog(owner);
        if (chosen == null) {
            return Optional.empty();
        }
        folder = chosen.getParentFile();
        return Optional.of(chosen.toPath());
    }

    private FileChooser chooser(String title) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle(title);
        chooser.getExtensionFilters().addAll(JSON, ALL);
        chooser.setInitialDirectory(folder);
        return chooser;
    }

    @Override
    public Optional<String> ask(String title, String question, List<String> answers) {
        Alert alert = alert(title, question);
        List<ButtonType> buttons = answers.stream().map(answer -> new ButtonType(answer,
                answer.equals(answers.get(0)) ? ButtonData.OK_DONE : answer.equals("Cancel") ? ButtonData.CANCEL_CLOSE : ButtonData.NO)).toList();
        alert.getButtonTypes().setAll(buttons);
        return alert.showAndWait().map(ButtonType::getText).filter(answer -> !answer.equals("Cancel"));
    }

    @Override
    public void tell(String title, String text) {
        alert(title, text).showAndWait();
    }

    private Alert alert(String title, String text) {
        Alert alert = new Alert(Alert.AlertType.NONE, text, ButtonType.OK);
        alert.initOwner(owner);
        alert.setTitle(title);
        alert.setHeaderText(title);
        alert.setResizable(true);
        alert.getDialogPane().setMinHeight(Region.USE_PREF_SIZE);
        alert.getDialogPane().getStyleClass().add("lw-dialog");
        theme.dress(alert.getDialogPane().getScene());
        return alert;
    }
}

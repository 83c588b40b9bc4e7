package layerweft.desktop.form;

import java.util.function.UnaryOperator;
import javafx.collections.ObservableList;
import layerweft.desktop.session.Document;
import layerweft.desktop.session.Session;
import layerweft.file.Fault;
import layerweft.file.FileTree;

/** Which of a document's two files a field belongs to. */
public enum Side {
    PORTFOLIO {
        @Override
        public FileTree tree(Document document) {
            return document.portfolio();
        }

        @Override
        public ObservableList<Fault> faults(Session session) {
            return session.portfolioFaults();
        }

        @Override
        public Document with(Document document, UnaryOperator<FileTree> edit) {
            return document.withPortfolio(edit);
        }
    },
    PROGRAMME {
        @Override
        public FileTree tree(Document document) {
            return document.programme();
        }

        @Override
        public ObservableList<Fault> faults(Session session) {
            return session.programmeFaults();
        }

        @Override
        public Document with(Document document, UnaryOperator<FileTree> edit) {
            return document.withProgramme(edit);
        }
    };

    public abstract FileTree tree(Document document);

    public abstract ObservableList<Fault> faults(Session session);

    public abstract Document with(Document document, UnaryOperator<FileTree> edit);
}

package layerweft;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.File;
import java.io.IOException;
import java.io.PrintStream;
import java.net.URL;
import java.net.URLClassLoader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Collectors;
import javax.tools.ToolProvider;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The README's lines on the use as a library compile and run as they stand. */
class LibraryExampleTest {

    @Test
    void theReadmesLinesCompileAndRun(@TempDir Path folder) throws Exception {
        String block = javaBlock(Files.readString(Path.of("README.md")));
        String imports = block.lines().filter(l -> l.startsWith("import ")).collect(Collectors.joining("\n"));
        String statements = block.lines().filter(l -> !l.startsWith("import ")).collect(Collectors.joining("\n"));
        assertTrue(statements.lines().filter(l -> !l.isBlank()).count() <= 10, "ten lines");
        Path source = folder.resolve("Example.java");
        Files.writeString(source, imports + "\npublic class Example { public static void main(String[] args) {\n" + statements + "\n}}\n");
        ByteArrayOutputStream messages = new ByteArrayOutputStream();
        int status = ToolProvider.getSystemJavaCompiler().run(null, messages, messages, "-cp", System.getProperty("java.class.path"), "-d",
                folder.toString(), source.toString());
        assertEquals(0, status, messages::toString);
        String printed = run(folder);
        assertTrue(printed.matches("Figure\\[value=0\\.\\d+, error=[0-9.E-]+]\\s*"), printed);
    }

    private static String javaBlock(String readme) {
        int section = readme.indexOf("## As a Java library");
        int start = readme.indexOf("```java\n", section) + "```java\n".length();
        return readme.substring(start, readme.indexOf("```", start));
    }

    private static String run(Path folder) throws IOException, ReflectiveOperationException {
        PrintStream before = System.out;
        ByteArrayOutputStream printed = new ByteArrayOutputStream();
        try (URLClassLoader loader = new URLClassLoader(new URL[] {new File(folder.toString()).toURI().toURL()})) {
            System.setOut(new PrintStream(printed, true, StandardCharsets.UTF_8));
            loader.loadClass("Example").getMethod("main", String[].class).invoke(null, (Object) new String[0]);
        } finally {
            System.setOut(before);
        }
        return printed.toString(StandardCharsets.UTF_8);
    }
}

// SPDX-License-Identifier: GPL-3.0-or-later
package org.brassbob.architecture;

import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.LineMap;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.Tree;
import com.sun.source.util.JavacTask;
import com.sun.source.util.SourcePositions;
import com.sun.source.util.TreeScanner;
import com.sun.source.util.Trees;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import javax.lang.model.element.Modifier;
import javax.tools.ToolProvider;
import org.jspecify.annotations.Nullable;

/** The sources as the compiler parses them: what classes don't tell, such as lengths and names of files. */
final class Sources {
    static final Path MAIN = Path.of("src/main/java");
    static final Path TEST = Path.of("src/test/java");

    private Sources() {}

    /**
     * A method or constructor.
     *
     * @param file where it stands
     * @param owner the kind of type that it belongs to
     * @param name its name; a constructor's is {@code <init>}
     * @param lines from its first annotation or modifier to its closing brace
     * @param parameters how many it takes
     * @param hidden whether it is private
     * @param annotations simple names
     */
    record Method(
            Path file,
            Tree.Kind owner,
            String name,
            long lines,
            int parameters,
            boolean hidden,
            List<String> annotations) {}

    static List<Path> files(Path root) {
        try (Stream<Path> files = Files.walk(root)) {
            return files.filter(f -> f.toString().endsWith(".java")).sorted().toList();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static String read(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static List<Method> methods(Path root) {
        var compiler = ToolProvider.getSystemJavaCompiler();
        try (var files = compiler.getStandardFileManager(null, Locale.ROOT, StandardCharsets.UTF_8)) {
            JavacTask task = (JavacTask) compiler.getTask(
                    null, files, null, List.of("-proc:none"), null, files.getJavaFileObjectsFromPaths(files(root)));
            SourcePositions positions = Trees.instance(task).getSourcePositions();
            List<Method> methods = new ArrayList<>();
            for (CompilationUnitTree unit : task.parse()) {
                new Collector(unit, positions, methods).scan(unit, null);
            }
            return methods;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static final class Collector extends TreeScanner<@Nullable Void, @Nullable ClassTree> {
        private final CompilationUnitTree unit;
        private final SourcePositions positions;
        private final List<Method> methods;

        Collector(CompilationUnitTree unit, SourcePositions positions, List<Method> methods) {
            this.unit = unit;
            this.positions = positions;
            this.methods = methods;
        }

        @Override
        public @Nullable Void visitClass(ClassTree type, @Nullable ClassTree outer) {
            return super.visitClass(type, type);
        }

        @Override
        public @Nullable Void visitMethod(MethodTree method, @Nullable ClassTree type) {
            LineMap lines = unit.getLineMap();
            long first = lines.getLineNumber(positions.getStartPosition(unit, method));
            long last = lines.getLineNumber(positions.getEndPosition(unit, method));
            methods.add(new Method(
                    Path.of(unit.getSourceFile().getName()),
                    type == null ? Tree.Kind.OTHER : type.getKind(),
                    method.getName().toString(),
                    last - first + 1,
                    method.getParameters().size(),
                    method.getModifiers().getFlags().contains(Modifier.PRIVATE),
                    method.getModifiers().getAnnotations().stream()
                            .map(a -> a.getAnnotationType().toString())
                            .map(a -> a.substring(a.lastIndexOf('.') + 1))
                            .toList()));
            return super.visitMethod(method, type);
        }
    }
}

package perveance.architecture;

import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.LineMap;
import com.sun.source.tree.Tree;
import com.sun.source.util.DocTrees;
import com.sun.source.util.JavacTask;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javax.tools.JavaFileObject;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;

/** Sources as the compiler's own syntax trees, with their comments. */
final class ParsedSources {
  /**
   * One source file.
   *
   * @param path where it is
   * @param unit its syntax tree
   * @param trees finds comments and positions
   */
  record ParsedFile(Path path, CompilationUnitTree unit, DocTrees trees) {
    /**
     * Where a tree stands, to be clicked.
     *
     * @param tree part of this file
     * @return file and line
     */
    String placeOf(Tree tree) {
      return path + ":" + lineOf(tree);
    }

    long lineOf(Tree tree) {
      return unit.getLineMap()
          .getLineNumber(trees.getSourcePositions().getStartPosition(unit, tree));
    }

    long lastLineOf(Tree tree) {
      LineMap map = unit.getLineMap();
      return map.getLineNumber(trees.getSourcePositions().getEndPosition(unit, tree));
    }
  }

  static final List<ParsedFile> MAIN = parse(Sources.under(Sources.MAIN));

  private ParsedSources() {}

  /**
   * Parses files without looking at what they refer to.
   *
   * @param paths Java files
   * @return their trees
   */
  private static List<ParsedFile> parse(List<Path> paths) {
    // the trees read their text later, so the file manager is left open
    StandardJavaFileManager files =
        ToolProvider.getSystemJavaCompiler()
            .getStandardFileManager(null, Locale.ROOT, StandardCharsets.UTF_8);
    return parse(files.getJavaFileObjectsFromPaths(paths));
  }

  /**
   * Parses a text that is no file of the program.
   *
   * @param text a whole Java source
   * @return its tree
   */
  static ParsedFile parse(String text) {
    return parse(List.of(new TextSource("Sample.java", text))).get(0);
  }

  private static List<ParsedFile> parse(Iterable<? extends JavaFileObject> sources) {
    JavacTask task =
        (JavacTask)
            ToolProvider.getSystemJavaCompiler()
                .getTask(null, null, null, List.of("-proc:none"), null, sources);
    DocTrees trees = DocTrees.instance(task);
    List<ParsedFile> parsed = new ArrayList<>();
    try {
      for (CompilationUnitTree unit : task.parse()) {
        parsed.add(new ParsedFile(Path.of(unit.getSourceFile().getName()), unit, trees));
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return List.copyOf(parsed);
  }
}

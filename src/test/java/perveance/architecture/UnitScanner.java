package perveance.architecture;

import com.sun.source.doctree.DocCommentTree;
import com.sun.source.doctree.DocTree;
import com.sun.source.doctree.ParamTree;
import com.sun.source.doctree.ReturnTree;
import com.sun.source.tree.ClassTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.Tree;
import com.sun.source.tree.VariableTree;
import com.sun.source.util.TreePath;
import com.sun.source.util.TreePathScanner;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import javax.lang.model.element.Modifier;
import org.jspecify.annotations.Nullable;
import perveance.architecture.ParsedSources.ParsedFile;

/**
 * Collects the parameters, results and record components of one file that hold numbers and whose
 * Javadoc states no unit. A method that overrides another inherits its words.
 */
final class UnitScanner extends TreePathScanner<@Nullable Void, @Nullable Void> {
  private static final Pattern NUMBER =
      Pattern.compile("\\b(double|float|Double|Float|OptionalDouble)\\b");

  private final ParsedFile file;
  private final List<String> missing = new ArrayList<>();

  UnitScanner(ParsedFile file) {
    this.file = file;
  }

  /**
   * What was found.
   *
   * @return place and missing tag, one per line
   */
  List<String> missing() {
    return List.copyOf(missing);
  }

  @Override
  public @Nullable Void visitClass(ClassTree type, @Nullable Void unused) {
    if (type.getModifiers().getFlags().contains(Modifier.PRIVATE)) {
      return null;
    }
    if (type.getKind() == Tree.Kind.RECORD) {
      requireParameters(components(type), getCurrentPath());
    }
    return super.visitClass(type, null);
  }

  @Override
  public @Nullable Void visitMethod(MethodTree method, @Nullable Void unused) {
    if (isPublic(method) && !overrides(method) && !isCanonical(method)) {
      requireParameters(method.getParameters(), getCurrentPath());
      Tree result = method.getReturnType();
      if (result != null && isNumber(result) && !UnitText.isStatedIn(returnComment())) {
        missing.add(file.placeOf(method) + ": @return ... [unit]");
      }
    }
    return null; // nothing inside a body is public
  }

  @Override
  public @Nullable Void visitVariable(VariableTree field, @Nullable Void unused) {
    return null;
  }

  private void requireParameters(List<? extends VariableTree> parameters, TreePath documented) {
    for (VariableTree parameter : parameters) {
      String name = parameter.getName().toString();
      if (isNumber(parameter.getType())
          && !UnitText.isStatedIn(parameterComment(documented, name))) {
        missing.add(file.placeOf(parameter) + ": @param " + name + " ... [unit]");
      }
    }
  }

  private boolean isPublic(MethodTree method) {
    boolean inInterface =
        getCurrentPath().getParentPath().getLeaf().getKind() == Tree.Kind.INTERFACE;
    var flags = method.getModifiers().getFlags();
    return flags.contains(Modifier.PUBLIC) || (inInterface && !flags.contains(Modifier.PRIVATE));
  }

  /** The constructor of a record that takes its components is documented where they stand. */
  private boolean isCanonical(MethodTree method) {
    ClassTree owner = (ClassTree) getCurrentPath().getParentPath().getLeaf();
    return method.getName().contentEquals("<init>")
        && owner.getKind() == Tree.Kind.RECORD
        && declarations(method.getParameters()).equals(declarations(components(owner)));
  }

  private static List<String> declarations(List<? extends VariableTree> variables) {
    return variables.stream().map(one -> one.getType() + " " + one.getName()).toList();
  }

  /** A record has no other fields that belong to an instance. */
  private static List<VariableTree> components(ClassTree type) {
    return type.getMembers().stream()
        .filter(VariableTree.class::isInstance)
        .map(VariableTree.class::cast)
        .filter(field -> !field.getModifiers().getFlags().contains(Modifier.STATIC))
        .toList();
  }

  private static boolean overrides(MethodTree method) {
    return method.getModifiers().getAnnotations().stream()
        .anyMatch(one -> one.getAnnotationType().toString().equals("Override"));
  }

  private static boolean isNumber(Tree type) {
    return NUMBER.matcher(type.toString()).find();
  }

  private String parameterComment(TreePath documented, String name) {
    return tags(documented)
        .filter(ParamTree.class::isInstance)
        .map(ParamTree.class::cast)
        .filter(tag -> !tag.isTypeParameter() && tag.getName().toString().equals(name))
        .map(tag -> text(tag.getDescription()))
        .collect(Collectors.joining(" "));
  }

  private String returnComment() {
    return tags(getCurrentPath())
        .filter(ReturnTree.class::isInstance)
        .map(tag -> text(((ReturnTree) tag).getDescription()))
        .collect(Collectors.joining(" "));
  }

  /** Block tags, and the inline form of the return tag, which stands in the first sentence. */
  private Stream<DocTree> tags(TreePath documented) {
    DocCommentTree comment = file.trees().getDocCommentTree(documented);
    if (comment == null) {
      return Stream.empty();
    }
    return Stream.concat(comment.getBlockTags().stream(), comment.getFullBody().stream())
        .map(DocTree.class::cast);
  }

  private static String text(List<? extends DocTree> description) {
    return description.stream().map(DocTree::toString).collect(Collectors.joining());
  }
}

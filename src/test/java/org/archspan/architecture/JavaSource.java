package org.archspan.architecture;

import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.tree.Tree;
import com.sun.source.tree.VariableTree;
import com.sun.source.util.DocTrees;
import com.sun.source.util.JavacTask;
import com.sun.source.util.TreePath;
import com.sun.source.util.TreePathScanner;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URI;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import javax.lang.model.element.Modifier;
import javax.tools.JavaFileObject;
import javax.tools.SimpleJavaFileObject;
import javax.tools.ToolProvider;

/** One source file as the compiler's own parser sees it. */
final class JavaSource {
  private static final Set<String> DOUBLES = Set.of("double", "double[]", "double[][]", "OptionalDouble");
  private static final List<String> KERNELS = List.of("/linalg/", "/mesh/", "/stability/");

  private final String name;
  private final boolean[] code;
  private final List<Declaration> publicDoubles = new ArrayList<>();
  private final List<Declaration> methods = new ArrayList<>();

  /** A declaration with its place, its Javadoc ("" when absent) and its length. */
  record Declaration(String where, String documentation, int codeLines) {
  }

  private JavaSource(String name, boolean[] code) {
    this.name = name;
    this.code = code;
  }

  static List<JavaSource> under(Path root) {
    try (Stream<Path> paths = Files.walk(root)) {
      return paths.filter(p -> p.toString().endsWith(".java")).sorted().map(JavaSource::read).toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static JavaSource read(Path path) {
    try {
      return parse(path.toString().replace('\\', '/'), Files.readString(path));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static JavaSource parse(String name, String text) {
    URI place = URI.create("string:///" + name);
    JavaFileObject file = new SimpleJavaFileObject(place, JavaFileObject.Kind.SOURCE) {
      @Override
      public CharSequence getCharContent(boolean ignoreErrors) {
        return text;
      }
    };
    JavacTask task = (JavacTask) ToolProvider.getSystemJavaCompiler()
        .getTask(null, null, null, List.of("-proc:none"), null, List.of(file));
    JavaSource source = new JavaSource(name, codeLines(text));
    try {
      CompilationUnitTree unit = task.parse().iterator().next();
      source.new Reader(DocTrees.instance(task), unit).scan(unit, null);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return source;
  }

  String name() {
    return name;
  }

  boolean isKernel() {
    return KERNELS.stream().anyMatch(name::contains);
  }

  int codeLines() {
    return codeLines(1, code.length);
  }

  List<Declaration> publicDoubles() {
    return publicDoubles;
  }

  List<Declaration> methods() {
    return methods;
  }

  private int codeLines(long first, long last) {
    int count = 0;
    for (int line = (int) first; line <= last; line++) {
      count += code[line - 1] ? 1 : 0;
    }
    return count;
  }

  /** Which lines carry code; comments must not begin behind code to be seen, which they never do here. */
  private static boolean[] codeLines(String text) {
    String[] lines = text.split("\n", -1);
    boolean[] code = new boolean[lines.length];
    boolean comment = false;
    for (int i = 0; i < lines.length; i++) {
      String line = lines[i].strip();
      comment = comment || line.startsWith("/*");
      code[i] = !comment && !line.isEmpty() && !line.startsWith("//");
      comment = comment && !line.contains("*/");
    }
    return code;
  }

  /** Collects what a reader of the public interface meets. */
  private final class Reader extends TreePathScanner<Void, Void> {
    private final DocTrees trees;
    private final CompilationUnitTree unit;

    Reader(DocTrees trees, CompilationUnitTree unit) {
      this.trees = trees;
      this.unit = unit;
    }

    @Override
    public Void visitMethod(MethodTree method, Void nothing) {
      methods.add(new Declaration(where(method.getName().toString()), documentation(), lines(method)));
      boolean override = method.getModifiers().getAnnotations().stream()
          .anyMatch(a -> a.getAnnotationType().toString().equals("Override"));
      if (!override && returnsDouble(method) && isPublic(method.getModifiers().getFlags())) {
        publicDoubles.add(new Declaration(where(method.getName().toString()), documentation(), 0));
      }
      return super.visitMethod(method, nothing);
    }

    @Override
    public Void visitVariable(VariableTree variable, Void nothing) {
      Tree owner = getCurrentPath().getParentPath().getLeaf();
      if (owner instanceof ClassTree type && DOUBLES.contains(String.valueOf(variable.getType()))) {
        boolean component = owner.getKind() == Tree.Kind.RECORD
            && !variable.getModifiers().getFlags().contains(Modifier.STATIC);
        if (component && typesArePublic(getCurrentPath().getParentPath())) {
          String text = parameter(comment(getCurrentPath().getParentPath()), variable.getName().toString());
          publicDoubles.add(new Declaration(where(variable.getName().toString()), text, 0));
        } else if (!component && isPublic(variable.getModifiers().getFlags())) {
          publicDoubles.add(new Declaration(where(variable.getName().toString()), documentation(), 0));
        }
      }
      return super.visitVariable(variable, nothing);
    }

    private boolean returnsDouble(MethodTree method) {
      return method.getReturnType() != null && DOUBLES.contains(method.getReturnType().toString());
    }

    /** A member is public when it says so or is in an interface, inside types that are public themselves. */
    private boolean isPublic(Set<Modifier> flags) {
      TreePath owner = getCurrentPath().getParentPath();
      boolean open = owner.getLeaf().getKind() == Tree.Kind.INTERFACE && !flags.contains(Modifier.PRIVATE);
      return (open || flags.contains(Modifier.PUBLIC)) && typesArePublic(owner);
    }

    private boolean typesArePublic(TreePath path) {
      for (TreePath p = path; p.getLeaf() instanceof ClassTree type; p = p.getParentPath()) {
        boolean inInterface = p.getParentPath().getLeaf().getKind() == Tree.Kind.INTERFACE;
        if (!inInterface && !type.getModifiers().getFlags().contains(Modifier.PUBLIC)) {
          return false;
        }
      }
      return true;
    }

    /** The Javadoc of the member, and that of its type where it speaks for all members. */
    private String documentation() {
      String type = comment(getCurrentPath().getParentPath());
      return comment(getCurrentPath()) + (UnitWords.coverMembers(type) ? type : "");
    }

    private String comment(TreePath path) {
      String text = trees.getDocComment(path);
      return text == null ? "" : text;
    }

    /** The words on one component; the whole comment where it has no tag of its own. */
    private String parameter(String comment, String component) {
      Matcher tag = Pattern.compile("@param\\s+" + component + "\\s([^@]*)").matcher(comment);
      return tag.find() ? tag.group(1) : comment;
    }

    private String where(String member) {
      StringBuilder types = new StringBuilder();
      TreePath path = getCurrentPath().getParentPath();
      while (path.getLeaf() instanceof ClassTree type) {
        types.insert(0, type.getSimpleName() + ".");
        path = path.getParentPath();
      }
      return name + ": " + types + member;
    }

    private int lines(Tree tree) {
      long start = trees.getSourcePositions().getStartPosition(unit, tree);
      long end = trees.getSourcePositions().getEndPosition(unit, tree);
      return start < 0 || end < 0 ? 0
          : codeLines(unit.getLineMap().getLineNumber(start), unit.getLineMap().getLineNumber(end));
    }
  }
}

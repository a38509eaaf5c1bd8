package fluewright.repl.language;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.codehaus.groovy.ast.ClassNode;
import org.codehaus.groovy.ast.ImportNode;
import org.codehaus.groovy.ast.ModuleNode;
import org.codehaus.groovy.classgen.GeneratorContext;
import org.codehaus.groovy.control.CompilePhase;
import org.codehaus.groovy.control.SourceUnit;
import org.codehaus.groovy.control.customizers.CompilationCustomizer;

/** Gives the imports of earlier inputs to later ones, as if they were one text. */
final class ImportMemory extends CompilationCustomizer {
    private final List<Consumer<ModuleNode>> kept = new ArrayList<>();
    private List<Consumer<ModuleNode>> found = List.of();

    ImportMemory() {
        super(CompilePhase.CONVERSION);
    }

    @Override
    public void call(SourceUnit source, GeneratorContext context, ClassNode type) {
        ModuleNode module = source.getAST();
        if (type == module.getClasses().get(0)) {
            found = importsOf(module);
            kept.forEach(statement -> statement.accept(module));
        }
    }

    /** Called when the input compiled, so that a faulty import is not repeated for ever. */
    void keep() {
        kept.addAll(found);
        found = List.of();
    }

    private static List<Consumer<ModuleNode>> importsOf(ModuleNode module) {
        List<Consumer<ModuleNode>> all = new ArrayList<>();
        for (ImportNode node : module.getImports()) {
            all.add(later -> later.addImport(node.getAlias(), node.getType()));
        }
        for (ImportNode node : module.getStarImports()) {
            all.add(later -> later.addStarImport(node.getPackageName()));
        }
        module.getStaticImports().forEach((alias, node) ->
            all.add(later -> later.addStaticImport(node.getType(), node.getFieldName(), alias)));
        module.getStaticStarImports().forEach((name, node) ->
            all.add(later -> later.addStaticStarImport(name, node.getType())));
        return all;
    }
}

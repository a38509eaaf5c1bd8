package fluewright.repl.language;

import org.codehaus.groovy.ast.ClassCodeVisitorSupport;
import org.codehaus.groovy.ast.ClassHelper;
import org.codehaus.groovy.ast.ClassNode;
import org.codehaus.groovy.ast.MethodNode;
import org.codehaus.groovy.ast.expr.ArgumentListExpression;
import org.codehaus.groovy.ast.expr.ClosureExpression;
import org.codehaus.groovy.ast.expr.StaticMethodCallExpression;
import org.codehaus.groovy.ast.stmt.BlockStatement;
import org.codehaus.groovy.ast.stmt.DoWhileStatement;
import org.codehaus.groovy.ast.stmt.ExpressionStatement;
import org.codehaus.groovy.ast.stmt.ForStatement;
import org.codehaus.groovy.ast.stmt.LoopingStatement;
import org.codehaus.groovy.ast.stmt.Statement;
import org.codehaus.groovy.ast.stmt.WhileStatement;
import org.codehaus.groovy.control.SourceUnit;

/**
 * Makes every loop, closure and method look at the interrupt flag. Groovy has an annotation for this,
 * but that is itself written in Groovy and adds a tenth of a second to the first evaluation.
 */
final class InterruptChecks extends ClassCodeVisitorSupport {
    private final SourceUnit source;

    InterruptChecks(SourceUnit source) {
        this.source = source;
    }

    @Override
    protected SourceUnit getSourceUnit() {
        return source;
    }

    @Override
    public void visitMethod(MethodNode method) {
        super.visitMethod(method);
        if (!method.isAbstract() && method.getCode() != null) {
            method.setCode(checked(method.getCode()));
        }
    }

    @Override
    public void visitClosureExpression(ClosureExpression closure) {
        super.visitClosureExpression(closure);
        closure.setCode(checked(closure.getCode()));
    }

    @Override
    public void visitForLoop(ForStatement loop) {
        super.visitForLoop(loop);
        check(loop);
    }

    @Override
    public void visitWhileLoop(WhileStatement loop) {
        super.visitWhileLoop(loop);
        check(loop);
    }

    @Override
    public void visitDoWhileLoop(DoWhileStatement loop) {
        super.visitDoWhileLoop(loop);
        check(loop);
    }

    private static void check(LoopingStatement loop) {
        loop.setLoopBlock(checked(loop.getLoopBlock()));
    }

    private static Statement checked(Statement body) {
        ClassNode base = ClassHelper.make(ShellScript.class);
        BlockStatement block = new BlockStatement();
        block.addStatement(new ExpressionStatement(
            new StaticMethodCallExpression(base, "checkInterrupt", ArgumentListExpression.EMPTY_ARGUMENTS)));
        block.addStatement(body);
        block.setSourcePosition(body);
        return block;
    }
}

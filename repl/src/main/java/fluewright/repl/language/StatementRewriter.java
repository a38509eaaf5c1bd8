package fluewright.repl.language;

import java.util.List;
import org.codehaus.groovy.ast.ClassNode;
import org.codehaus.groovy.ast.MethodNode;
import org.codehaus.groovy.ast.Parameter;
import org.codehaus.groovy.ast.expr.ArgumentListExpression;
import org.codehaus.groovy.ast.expr.BinaryExpression;
import org.codehaus.groovy.ast.expr.ConstantExpression;
import org.codehaus.groovy.ast.expr.DeclarationExpression;
import org.codehaus.groovy.ast.expr.Expression;
import org.codehaus.groovy.ast.expr.MethodCallExpression;
import org.codehaus.groovy.ast.expr.VariableExpression;
import org.codehaus.groovy.ast.stmt.BlockStatement;
import org.codehaus.groovy.ast.stmt.ExpressionStatement;
import org.codehaus.groovy.ast.stmt.Statement;
import org.codehaus.groovy.classgen.GeneratorContext;
import org.codehaus.groovy.control.CompilePhase;
import org.codehaus.groovy.control.SourceUnit;
import org.codehaus.groovy.control.customizers.CompilationCustomizer;
import org.codehaus.groovy.syntax.Types;

/**
 * Makes every top-level statement of a script tell its value, every call by the name of a shell
 * function reach that function, and all of it interruptible.
 */
final class StatementRewriter extends CompilationCustomizer {
    private final Names names;
    private final boolean acknowledge;

    /** @param acknowledge whether a closing assignment is told as well */
    StatementRewriter(Names names, boolean acknowledge) {
        super(CompilePhase.CONVERSION);
        this.names = names;
        this.acknowledge = acknowledge;
    }

    @Override
    public void call(SourceUnit source, GeneratorContext context, ClassNode type) {
        FunctionCalls functionCalls = new FunctionCalls(source, names, type);
        functionCalls.visitContents(type);
        MethodNode run = type.isScript() ? type.getMethod("run", Parameter.EMPTY_ARRAY) : null;
        if (run != null && run.getCode() instanceof BlockStatement body) {
            rewrite(body.getStatements());
        }
        new InterruptChecks(source).visitClass(type);
    }

    private void rewrite(List<Statement> statements) {
        for (int at = 0; at < statements.size(); at++) {
            if (statements.get(at) instanceof ExpressionStatement statement) {
                rewrite(statement, at == statements.size() - 1);
            }
        }
    }

    private void rewrite(ExpressionStatement statement, boolean last) {
        Expression value = statement.getExpression();
        if (!(value instanceof BinaryExpression pair) || !isAssignment(pair)) {
            statement.setExpression(call("show", value, value));
        } else if (acknowledge && last && isPlainVariable(pair)) {
            Expression name = new ConstantExpression(pair.getLeftExpression().getText());
            statement.setExpression(call("assigned", value, name, value));
        }
    }

    private static boolean isAssignment(BinaryExpression pair) {
        return Types.ofType(pair.getOperation().getType(), Types.ASSIGNMENT_OPERATOR);
    }

    private static boolean isPlainVariable(BinaryExpression pair) {
        return !(pair instanceof DeclarationExpression)
            && pair.getLeftExpression() instanceof VariableExpression;
    }

    private static Expression call(String method, Expression position, Expression... arguments) {
        MethodCallExpression call = new MethodCallExpression(
            VariableExpression.THIS_EXPRESSION, method, new ArgumentListExpression(arguments));
        call.setImplicitThis(true);
        call.setSourcePosition(position);
        return call;
    }
}

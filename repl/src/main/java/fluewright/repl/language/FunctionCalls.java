package fluewright.repl.language;

import java.util.List;
import org.codehaus.groovy.ast.ClassCodeExpressionTransformer;
import org.codehaus.groovy.ast.ClassHelper;
import org.codehaus.groovy.ast.ClassNode;
import org.codehaus.groovy.ast.expr.ArgumentListExpression;
import org.codehaus.groovy.ast.expr.ArrayExpression;
import org.codehaus.groovy.ast.expr.ClosureExpression;
import org.codehaus.groovy.ast.expr.ConstantExpression;
import org.codehaus.groovy.ast.expr.Expression;
import org.codehaus.groovy.ast.expr.MapExpression;
import org.codehaus.groovy.ast.expr.MethodCallExpression;
import org.codehaus.groovy.ast.expr.NamedArgumentListExpression;
import org.codehaus.groovy.ast.expr.SpreadExpression;
import org.codehaus.groovy.ast.expr.TupleExpression;
import org.codehaus.groovy.control.SourceUnit;

/**
 * Turns {@code name(args)} into {@code callFunction('name', args)} where the name is a shell
 * function. Done on the syntax tree because Groovy itself would prefer a variable, or one of the
 * methods it adds to every object, of the same name.
 */
final class FunctionCalls extends ClassCodeExpressionTransformer {
    private final SourceUnit source;
    private final Names names;
    private final ClassNode owner;

    FunctionCalls(SourceUnit source, Names names, ClassNode owner) {
        this.source = source;
        this.names = names;
        this.owner = owner;
    }

    @Override
    protected SourceUnit getSourceUnit() {
        return source;
    }

    void visitContents(ClassNode type) {
        if (type.isScript()) {
            visitClass(type);
        }
    }

    @Override
    public Expression transform(Expression expression) {
        if (expression instanceof ClosureExpression closure) {
            closure.getCode().visit(this);
            return closure;
        }
        if (expression instanceof MethodCallExpression call && isFunction(call)) {
            return redirected(call);
        }
        return super.transform(expression);
    }

    /** A method that the script itself declares goes before a function. */
    private boolean isFunction(MethodCallExpression call) {
        String name = call.getMethodAsString();
        return call.isImplicitThis() && name != null && names.isFunction(name)
            && owner.getDeclaredMethods(name).isEmpty() && !spreads(call.getArguments());
    }

    private static boolean spreads(Expression arguments) {
        return arguments instanceof TupleExpression list
            && list.getExpressions().stream().anyMatch(SpreadExpression.class::isInstance);
    }

    private Expression redirected(MethodCallExpression call) {
        Expression arguments = new ArrayExpression(
            ClassHelper.OBJECT_TYPE, positional(transform(call.getArguments())));
        MethodCallExpression result = new MethodCallExpression(call.getObjectExpression(), "callFunction",
            new ArgumentListExpression(new ConstantExpression(call.getMethodAsString()), arguments));
        result.setImplicitThis(true);
        result.setSourcePosition(call);
        return result;
    }

    private static List<Expression> positional(Expression arguments) {
        return ((TupleExpression) arguments).getExpressions().stream().map(FunctionCalls::plainMap).toList();
    }

    private static Expression plainMap(Expression argument) {
        if (argument instanceof NamedArgumentListExpression named) {
            MapExpression map = new MapExpression(named.getMapEntryExpressions());
            map.setSourcePosition(named);
            return map;
        }
        return argument;
    }
}

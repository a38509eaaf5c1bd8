package fluewright.engine.fuel;

import fluewright.engine.message.Detail;
import fluewright.engine.message.EngineMessage;
import fluewright.engine.message.InputException;
import fluewright.engine.message.Notes;
import fluewright.engine.quantity.Numbers;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Makes the shares of a composition add up to one. Within one percent they are scaled and a remark says so; beyond it
 * they are refused (1 % is what ASTM D1945 allows the unnormalised total of a gas analysis, from memory).
 */
final class Closure {

    private static final double TOLERANCE = 0.01;
    private static final double ROUNDING = 1e-9;

    private Closure() {
    }

    static Map<String, Double> close(Map<String, Double> shares, String where, String hint, Notes notes) {
        shares.forEach((name, share) -> requireShare(where, name, share));
        double sum = shares.values().stream().mapToDouble(Double::doubleValue).sum();
        if (!(Math.abs(sum - 1) <= TOLERANCE + ROUNDING)) {
            throw new InputException(EngineMessage.NOT_CLOSED, Detail.at(where).found(Numbers.percent(sum))
                    .expected("100 % within 1 %" + hint));
        }
        if (Math.abs(sum - 1) <= ROUNDING) {
            return shares;
        }
        notes.remark(EngineMessage.NORMALISED, Detail.at(where).found(Numbers.percent(sum)));
        Map<String, Double> scaled = new LinkedHashMap<>();
        shares.forEach((name, share) -> scaled.put(name, share / sum));
        return scaled;
    }

    static void requireShare(String where, String name, double share) {
        if (!(share >= 0 && share <= 1)) {
            throw new InputException(EngineMessage.IMPOSSIBLE,
                    Detail.at(where + " " + name).found(Numbers.percent(share)).expected("0 % to 100 %"));
        }
    }
}

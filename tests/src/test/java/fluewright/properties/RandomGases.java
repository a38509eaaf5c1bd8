package fluewright.properties;

import fluewright.engine.fuel.Fuel;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Provide;
import net.jqwik.api.domains.DomainContextBase;

/** Random gas blends alone. */
public class RandomGases extends DomainContextBase {

    @Provide
    Arbitrary<Fuel> gases() {
        return RandomFuels.gases();
    }
}

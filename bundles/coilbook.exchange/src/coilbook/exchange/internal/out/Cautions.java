package coilbook.exchange.internal.out;

import java.util.List;

/** What everybody who acts on a workbook must have read. */
final class Cautions {

    static final List<String> ALL = List.of(
            "Before anything is touched: isolate and lock out, prove dead, and wait for capacitors to discharge. Capacitors keep a dangerous charge after "
                    + "disconnection.",
            "Hot adhesive and heated parts burn. Let them cool, or wear what the site prescribes.",
            "Local codes and a licensed electrician decide what may be connected, how, and by whom. The electrical work belongs in licensed hands.",
            "This workbook says which criteria are met and which are not. It does not say that a circuit is safe.",
            "Undetermined means that a value is missing: it is neither conformity nor nonconformity. Silence is never conformity.");

    private Cautions() {
    }
}

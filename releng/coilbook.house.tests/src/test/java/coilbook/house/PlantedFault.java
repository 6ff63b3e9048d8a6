package coilbook.house;

/** Read by the analyser's own test: asks for the length of what is always null. */
final class PlantedFault {

    private PlantedFault() {
    }

    static int length() {
        String nothing = null;
        return nothing.length();
    }
}

package coilbook.workbench.internal;

/** The ids of the window's model that code refers to; they stand in {@code Application.e4xmi}. */
public final class WorkbenchIds {

    /** The program's name, which is not translated. */
    public static final String NAME = "Coilbook";
    public static final String WINDOW = "coilbook.window";
    public static final String PLACES = "coilbook.part.places";
    public static final String RIGHT = "coilbook.right";
    public static final String STATIONS = "coilbook.part.stations";
    public static final String BELOW = "coilbook.below";
    public static final String WHY = "coilbook.part.why";
    public static final String WAVEFORM = "coilbook.part.waveform";
    public static final String UNDO = "coilbook.command.undo";
    public static final String REDO = "coilbook.command.redo";
    /** The parameter of the command that goes to a part: the part's id. */
    public static final String PART = "coilbook.parameter.part";
    /** The parameter of the command that changes the look: light or dark. */
    public static final String LOOK = "coilbook.parameter.look";
    /** The parameter of the command that shows a help page: its name. */
    public static final String PAGE = "coilbook.parameter.page";

    private WorkbenchIds() {
    }
}

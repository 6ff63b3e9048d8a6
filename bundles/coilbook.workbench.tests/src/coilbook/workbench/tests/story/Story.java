package coilbook.workbench.tests.story;

import coilbook.workbench.tests.support.WindowRun;

/** Something a person does in the open window, and what has to come of it. */
public interface Story {

    /** What is shown by it, as the test's name. */
    String name();

    /** Plays it; anything thrown is a failure. */
    void play(WindowRun window) throws Exception;
}

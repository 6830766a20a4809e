package hemline.viewer.viewmodel;

/** What actions ask of the window they run in. */
public interface Desk {
    void chooseFiles();

    void chooseFolder();

    void chooseMapLayer();

    void copyPicture();

    void savePicture();

    void searchCommands();

    void showShortcuts();

    void focusFilter();

    /** Moves the keyboard to the next part of the window. */
    void nextPart();

    void close();
}

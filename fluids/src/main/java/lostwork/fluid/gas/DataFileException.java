package lostwork.fluid.gas;

/** Thrown when a data file of this library cannot be read; the message names the file and the line. */
public final class DataFileException extends IllegalStateException {
    private static final long serialVersionUID = 1L;

    /** The file. */
    private final String file;
    /** The line, from 1; 0 when the failure belongs to no line. */
    private final int line;

    DataFileException(String file, int line, String why) {
        super(file + (line > 0 ? ":" + line : "") + ": " + why);
        this.file = file;
        this.line = line;
    }

    /** {@return the name of the file} */
    public String file() {
        return file;
    }

    /** {@return the line, counted from 1; 0 when the failure belongs to no line} */
    public int line() {
        return line;
    }
}

package fluewright.fuels;

import fluewright.engine.message.Message;

/** What is wrong with a fuel file. Errors that the engine finds in its numbers keep the engine's constants. */
public enum FuelFileMessage implements Message {
    /** The file or folder is missing, is of another sort, or may not be read. */
    UNREADABLE("the fuel file cannot be read"),
    /** More bytes than a fuel file can need. */
    TOO_LARGE("the fuel file is too large"),
    /** Bytes that are no UTF-8 text. */
    NOT_UTF8("the fuel file is not UTF-8 text"),
    /** Text that is no YAML. */
    NOT_YAML("the fuel file is not valid YAML"),
    /** Nothing but comments. */
    EMPTY("the fuel file is empty"),
    /** A second document in the same file. */
    SEVERAL_DOCUMENTS("a fuel file holds one fuel only"),
    /** An anchor or alias; they can make a small file unfold without end. */
    ALIAS("anchors and aliases have no place in a fuel file"),
    /** Nested deeper than the format. */
    TOO_DEEP("the fuel file is nested too deeply"),
    /** A file called otherwise than a fuel file. */
    WRONG_FILE_NAME("a fuel file is called by the fuel's id and ends in .yaml"),
    /** A key that stands twice, or a component under two of its names. */
    DUPLICATE_KEY("this key stands twice"),
    /** A key that the format does not have. */
    UNKNOWN_KEY("there is no such key"),
    /** A key that is needed and is not there. */
    MISSING_KEY("a key is missing"),
    /** A key without a value. */
    MISSING_VALUE("a value is missing"),
    /** A number without its source. */
    MISSING_SOURCE("a number needs its source"),
    /** A key that has no meaning for this phase. */
    KEY_DOES_NOT_FIT("this key has no meaning for the phase of the fuel"),
    /** A list where a text is due, and the like. */
    WRONG_TYPE("the value is of the wrong type"),
    /** A word other than those the key takes. */
    UNKNOWN_WORD("this word is not one of those the key takes"),
    /** A text with control characters. */
    CONTROL_CHARACTER("the text holds a control character"),
    /** An id of other characters. */
    BAD_ID("an id is made of a to z, 0 to 9 and single hyphens between them"),
    /** An id and a file name that differ. */
    ID_IS_NOT_FILE_NAME("the id is not the name of the file"),
    /** A bare number. */
    NUMBER_WITHOUT_UNIT("the number needs its unit"),
    /** A comma in a number. */
    DECIMAL_COMMA("a number is written with a decimal point and without separators of thousands"),
    /** A unit that does not belong to the key. */
    WRONG_UNIT("the unit does not fit the key"),
    /** A share below zero or above one hundred percent. */
    SHARE_OUTSIDE("a share lies between 0 % and 100 %"),
    /** Zero or less where there must be something. */
    NOT_POSITIVE("the number must be greater than zero");

    private final String sentence;

    FuelFileMessage(String sentence) {
        this.sentence = sentence;
    }

    @Override
    public String sentence() {
        return sentence;
    }
}

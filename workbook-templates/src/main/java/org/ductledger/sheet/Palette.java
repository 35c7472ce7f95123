package org.ductledger.sheet;

import org.apache.poi.xssf.usermodel.XSSFColor;

/**
 * The program's own colours. Each sets off a kind of cell that a border or a word sets off as well, so that a print in
 * black and white says the same.
 */
public enum Palette {
    INK("1E2B33"),
    QUIET("66737B"),
    RULE("9AA8AE"),
    DUCT("1F5F6B"),
    BAND("DDE8E6"),
    STRAW("FFF3CC"),
    MIST("E4ECF5"),
    SLATE("F1F3F2"),
    BRICK("A8401F"),
    BLUSH("F8DDD3"),
    PLUM("5B3E8C"),
    PAPER("FFFFFF");

    private final String hex;

    Palette(String hex) {
        this.hex = hex;
    }

    XSSFColor color() {
        return new XSSFColor(rgb());
    }

    byte[] rgb() {
        int all = Integer.parseInt(hex, 16);
        return new byte[] {(byte) (all >> 16), (byte) (all >> 8), (byte) all};
    }
}

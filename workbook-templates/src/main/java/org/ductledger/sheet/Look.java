package org.ductledger.sheet;

import org.apache.poi.ss.usermodel.BorderStyle;
import org.apache.poi.ss.usermodel.HorizontalAlignment;

/** The kinds of cell, and how each looks: by colour, and by border or letter as well. */
public enum Look {
    TITLE(Font.TITLE, Palette.DUCT, Palette.PAPER, Edge.NONE, HorizontalAlignment.LEFT, false),
    HEADING(Font.BOLD, Palette.PAPER, Palette.DUCT, Edge.NONE, HorizontalAlignment.LEFT, false),
    COLUMN_HEAD(Font.BOLD, Palette.INK, Palette.BAND, Edge.UNDER, HorizontalAlignment.CENTER, true),
    TEXT(Font.PLAIN, Palette.INK, Palette.PAPER, Edge.NONE, HorizontalAlignment.LEFT, true),
    STRONG(Font.BOLD, Palette.INK, Palette.PAPER, Edge.NONE, HorizontalAlignment.LEFT, false),
    /** A note that runs on over the cells beside it. */
    ASIDE(Font.ITALIC, Palette.QUIET, Palette.PAPER, Edge.NONE, HorizontalAlignment.LEFT, false),
    NOTE(Font.ITALIC, Palette.QUIET, Palette.PAPER, Edge.NONE, HorizontalAlignment.LEFT, true),
    /** The user's to change: straw, in a full frame. */
    INPUT(Font.PLAIN, Palette.INK, Palette.STRAW, Edge.FRAME, HorizontalAlignment.RIGHT, false),
    INPUT_TEXT(Font.PLAIN, Palette.INK, Palette.STRAW, Edge.FRAME, HorizontalAlignment.LEFT, true),
    /** A live formula: plain paper, a thin line beneath. */
    LIVE(Font.PLAIN, Palette.INK, Palette.PAPER, Edge.UNDER, HorizontalAlignment.RIGHT, false),
    /** A filled value: mist, italic, a dotted line beneath. */
    FILLED(Font.ITALIC, Palette.INK, Palette.MIST, Edge.DOTS, HorizontalAlignment.RIGHT, false),
    /** A check in words: bold, between two lines. */
    CHECK(Font.BOLD, Palette.DUCT, Palette.PAPER, Edge.RAILS, HorizontalAlignment.CENTER, true),
    /** A working cell: small, grey, a dashed line beneath. */
    WORKING(Font.SMALL, Palette.QUIET, Palette.SLATE, Edge.DASHES, HorizontalAlignment.RIGHT, false),
    WORKING_HEAD(Font.SMALL, Palette.QUIET, Palette.SLATE, Edge.DASHES, HorizontalAlignment.CENTER, true),
    CENTRED(Font.PLAIN, Palette.INK, Palette.PAPER, Edge.NONE, HorizontalAlignment.CENTER, false),
    RECORD(Font.SMALL, Palette.INK, Palette.PAPER, Edge.UNDER, HorizontalAlignment.LEFT, true);

    /** The letters of a look. */
    enum Font {
        TITLE(16, true, false),
        PLAIN(9, false, false),
        BOLD(9, true, false),
        ITALIC(9, false, true),
        SMALL(8, false, false);

        final short points;
        final boolean bold;
        final boolean italic;

        Font(int points, boolean bold, boolean italic) {
            this.points = (short) points;
            this.bold = bold;
            this.italic = italic;
        }
    }

    /** The border of a look: top, sides, bottom. */
    enum Edge {
        NONE(BorderStyle.NONE, BorderStyle.NONE, BorderStyle.NONE),
        UNDER(BorderStyle.NONE, BorderStyle.NONE, BorderStyle.THIN),
        DOTS(BorderStyle.NONE, BorderStyle.NONE, BorderStyle.DOTTED),
        DASHES(BorderStyle.NONE, BorderStyle.NONE, BorderStyle.DASHED),
        RAILS(BorderStyle.THIN, BorderStyle.NONE, BorderStyle.THIN),
        FRAME(BorderStyle.THIN, BorderStyle.THIN, BorderStyle.THIN);

        final BorderStyle top;
        final BorderStyle sides;
        final BorderStyle bottom;

        Edge(BorderStyle top, BorderStyle sides, BorderStyle bottom) {
            this.top = top;
            this.sides = sides;
            this.bottom = bottom;
        }
    }

    final Font font;
    final Palette ink;
    final Palette fill;
    final Edge edge;
    final HorizontalAlignment align;
    final boolean wraps;

    Look(Font font, Palette ink, Palette fill, Edge edge, HorizontalAlignment align, boolean wraps) {
        this.font = font;
        this.ink = ink;
        this.fill = fill;
        this.edge = edge;
        this.align = align;
        this.wraps = wraps;
    }

    /** Whether cells of this look are the user's to change. */
    public boolean isUnlocked() {
        return this == INPUT || this == INPUT_TEXT;
    }
}

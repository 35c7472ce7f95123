package org.ductledger.sheet;

import org.apache.poi.xssf.usermodel.XSSFChart;
import org.openxmlformats.schemas.drawingml.x2006.chart.CTTitle;
import org.openxmlformats.schemas.drawingml.x2006.chart.CTValAx;
import org.openxmlformats.schemas.drawingml.x2006.main.CTRegularTextRun;
import org.openxmlformats.schemas.drawingml.x2006.main.CTTextBody;
import org.openxmlformats.schemas.drawingml.x2006.main.CTTextCharacterProperties;
import org.openxmlformats.schemas.drawingml.x2006.main.CTTextParagraph;

/** The letters of a chart: their size, and their language, which would else be that of the machine. */
final class ChartLetters {
    private static final String LANGUAGE = "en-US";
    private static final int TITLE = 1300;
    private static final int AXIS_TITLE = 1000;
    private static final int LABEL = 900;

    private ChartLetters() {}

    static void set(XSSFChart chart) {
        title(chart.getCTChart().getTitle(), TITLE);
        for (CTValAx axis : chart.getCTChart().getPlotArea().getValAxArray()) {
            if (axis.isSetTitle()) {
                title(axis.getTitle(), AXIS_TITLE);
            }
            label(axis.isSetTxPr() ? axis.getTxPr() : axis.addNewTxPr());
        }
        label(
                chart.getCTChart().getLegend().isSetTxPr()
                        ? chart.getCTChart().getLegend().getTxPr()
                        : chart.getCTChart().getLegend().addNewTxPr());
    }

    private static void title(CTTitle title, int size) {
        for (CTTextParagraph paragraph : title.getTx().getRich().getPArray()) {
            for (CTRegularTextRun run : paragraph.getRArray()) {
                letters(run.isSetRPr() ? run.getRPr() : run.addNewRPr(), size, true);
            }
        }
    }

    private static void label(CTTextBody body) {
        if (body.getBodyPr() == null) {
            body.addNewBodyPr();
        }
        CTTextParagraph paragraph = body.sizeOfPArray() > 0 ? body.getPArray(0) : body.addNewP();
        if (!paragraph.isSetPPr()) {
            paragraph.addNewPPr();
        }
        if (!paragraph.getPPr().isSetDefRPr()) {
            paragraph.getPPr().addNewDefRPr();
        }
        letters(paragraph.getPPr().getDefRPr(), LABEL, false);
        if (!paragraph.isSetEndParaRPr()) {
            paragraph.addNewEndParaRPr().setLang(LANGUAGE);
        }
    }

    private static void letters(CTTextCharacterProperties letters, int size, boolean bold) {
        letters.setLang(LANGUAGE);
        letters.setSz(size);
        letters.setB(bold);
    }
}

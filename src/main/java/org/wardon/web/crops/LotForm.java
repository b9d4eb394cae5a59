package org.wardon.web.crops;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.wardon.advice.outlook.OwnLotReport;
import org.wardon.advice.wording.Words;
import org.wardon.errors.Fault;
import org.wardon.files.forecast.OwnLotsAnswer;
import org.wardon.produce.Commodity;
import org.wardon.produce.rows.OwnLot;
import org.wardon.web.pages.Call;
import org.wardon.web.pages.FieldView;
import org.wardon.web.pages.Figures;
import org.wardon.web.pages.PageWords;

/** Own lots that are gone, and the form that remembers one. */
final class LotForm {
    private final Call call;
    private final Commodity crop;
    private final PageWords page;
    private final Words words;
    private final Figures figures;

    LotForm(Call call, Commodity crop, PageWords page, Words words) {
        this.call = call;
        this.crop = crop;
        this.page = page;
        this.words = words;
        figures = call.figures();
    }

    CropView.LotsView view(OwnLotReport report, List<Fault> faults) {
        KeepForm went =
                new KeepForm(
                        "lot-",
                        crop,
                        name -> faults.isEmpty() ? "" : call.field(name),
                        page,
                        figures);
        List<FieldView> fields = new ArrayList<>(went.fields(faults));
        fields.add(text("lot-on", "date", "--on", faults));
        fields.add(text("lot-name", "text", "--lot", faults));
        fields.add(text("lot-note", "text", "--note", faults));
        List<String> told = new ArrayList<>();
        OwnLotsAnswer answer = report.answer();
        if (!answer.lots().isEmpty()) {
            told.add(
                    figures.text(
                            page.say(
                                    "crop.lots-told",
                                    figures.temperature(answer.atC()),
                                    words.range(answer.days()),
                                    words.range(answer.publishedDays()))));
        }
        report.reasons().forEach(reason -> told.add(figures.text(words.sentence(reason))));
        return new CropView.LotsView(
                answer.lots().stream().map(this::line).toList(),
                told,
                ends(faults.isEmpty() ? "" : call.field("lot-ended")),
                fields,
                KeepForm.besideFields(faults, fields));
    }

    private FieldView text(String name, String kind, String option, List<Fault> faults) {
        FieldView plain =
                new FieldView(
                        name,
                        page.say(name),
                        faults.isEmpty() ? "" : call.field(name),
                        "",
                        "",
                        "",
                        kind,
                        false);
        return KeepForm.withFault(plain, option, faults);
    }

    private List<CropView.Pick> ends(String taken) {
        List<CropView.Pick> picks = new ArrayList<>();
        for (OwnLot.Ended one : OwnLot.Ended.values()) {
            String word = one.name().toLowerCase(Locale.ROOT);
            picks.add(new CropView.Pick(word, page.say("ended." + word), word.equals(taken)));
        }
        return picks;
    }

    private CropView.LotLine line(OwnLotsAnswer.Lot lot) {
        boolean sound = lot.ended().equals("sold") || lot.ended().equals("spoilt");
        return new CropView.LotLine(
                lot.number(),
                page.say(
                        sound ? "crop.lot-line-least" : "crop.lot-line",
                        lot.endedOn(),
                        page.say("ended." + lot.ended()),
                        figures.figure(lot.days(), "day"),
                        figures.temperature(lot.meanC()),
                        figures.figure(lot.publishedPct(), "pct"),
                        String.join(" ", lot.lot(), lot.variant(), lot.note()).strip()));
    }
}

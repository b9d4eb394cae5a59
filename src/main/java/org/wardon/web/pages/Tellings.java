package org.wardon.web.pages;

import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.wardon.files.forecast.Because;
import org.wardon.files.forecast.Forecast;

/**
 * Many sentences told shortly: what is said of several lots in the same words is said once for all
 * of them, and where there are very many the first of each kind stands for its kind.
 */
public final class Tellings {
    /** So many of a kind are shown one by one all the same. */
    private static final int FEW = 2;

    /** So many lots are named where a kind is told shortly; of dangers all are. */
    private static final int MOST_NAMED = 8;

    private final PageWords words;
    private final Figures figures;

    /**
     * Prepares.
     *
     * @param words words of the pages
     * @param figures figures of the person
     */
    public Tellings(PageWords words, Figures figures) {
        this.words = words;
        this.figures = figures;
    }

    /**
     * Takes a warning.
     *
     * @param warning the warning
     * @return the same to be told
     */
    static Telling of(Forecast.Warning warning) {
        return new Telling(
                warning.level(),
                warning.code(),
                List.of(warning.subject().split(",", -1)[0]),
                warning.text(),
                warning.source());
    }

    /**
     * Takes a reason.
     *
     * @param because the reason
     * @return the same to be told
     */
    static Telling of(Because because) {
        return new Telling("", because.code(), because.lots(), because.text(), because.source());
    }

    /**
     * Says the same words once for all they are about.
     *
     * @param all sentences
     * @return fewer, in the order of the first of each
     */
    public List<Telling> once(List<Telling> all) {
        Map<List<String>, List<Telling>> same = new LinkedHashMap<>();
        for (Telling one : all) {
            same.computeIfAbsent(
                            List.of(one.level(), one.code(), one.source(), one.bare()),
                            any -> new ArrayList<>())
                    .add(one);
        }
        return same.values().stream().map(this::joined).toList();
    }

    private Telling joined(List<Telling> same) {
        Telling first = same.get(0);
        List<String> about = named(same);
        return same.size() == 1 || first.bare().equals(first.text())
                ? first
                : new Telling(
                        first.level(),
                        first.code(),
                        about,
                        String.join(", ", about) + ": " + first.bare(),
                        first.source());
    }

    /** Whom sentences are about: what a sentence begins with. */
    private static List<String> named(Collection<Telling> all) {
        return all.stream().flatMap(one -> one.about().stream().limit(1)).distinct().toList();
    }

    /**
     * Tells sentences one by one, or a kind by its first where there are too many.
     *
     * @param all sentences
     * @param most so many are told one by one
     * @param href where all of a kind stand, by its code
     * @return what is shown
     */
    public List<CautionView> brief(List<Telling> all, int most, Function<String, String> href) {
        List<Telling> once = once(all);
        if (once.size() <= most) {
            return once.stream().map(this::shortened).map(this::view).toList();
        }
        Map<String, List<Telling>> kinds =
                once.stream()
                        .collect(
                                Collectors.groupingBy(
                                        one -> one.level() + " " + one.code(),
                                        LinkedHashMap::new,
                                        Collectors.toList()));
        List<CautionView> views = new ArrayList<>();
        for (List<Telling> kind : kinds.values()) {
            if (kind.size() <= FEW) {
                kind.forEach(one -> views.add(view(shortened(one))));
            } else {
                views.add(folded(kind, href.apply(kind.get(0).code())));
            }
        }
        return views;
    }

    /** Names some of those it is said of where it is said of very many. */
    private Telling shortened(Telling one) {
        return one.about().size() <= MOST_NAMED || one.bare().isEmpty() || isDanger(one)
                ? one
                : new Telling(
                        one.level(),
                        one.code(),
                        one.about(),
                        one.text().replace(String.join(", ", one.about()), some(one.about())),
                        one.source());
    }

    private static boolean isDanger(Telling one) {
        return one.level().equals("danger");
    }

    private String some(List<String> names) {
        return names.size() <= MOST_NAMED
                ? String.join(", ", names)
                : words.say(
                        "tellings.and-more",
                        String.join(", ", names.subList(0, MOST_NAMED)),
                        String.valueOf(names.size() - MOST_NAMED));
    }

    private CautionView folded(List<Telling> kind, String href) {
        Telling first = kind.get(0);
        List<Telling> rest = kind.subList(1, kind.size());
        Set<String> others = new LinkedHashSet<>();
        rest.forEach(one -> others.addAll(one.about()));
        first.about().forEach(others::remove);
        String names = isDanger(first) ? String.join(", ", others) : some(List.copyOf(others));
        MoreView more =
                new MoreView(
                        first.level().isEmpty() || others.isEmpty()
                                ? words.say("tellings.like-it", String.valueOf(rest.size()))
                                : words.say("tellings.so-too", names),
                        new LinkView(href, words.say("tellings.all", String.valueOf(kind.size()))));
        return view(shortened(first)).with(more);
    }

    /**
     * Returns a sentence as a page shows it.
     *
     * @param one the sentence
     * @return the view
     */
    public CautionView view(Telling one) {
        return new CautionView(
                one.level(), figures.text(one.text()), one.source(), Optional.empty());
    }
}

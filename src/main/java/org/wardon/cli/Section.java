package org.wardon.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import org.wardon.advice.forecast.SectionAdvice;
import org.wardon.advice.picture.SectionPicture;
import org.wardon.advice.wording.Words;
import org.wardon.errors.BadInput;
import org.wardon.files.AtomicFile;
import org.wardon.files.forecast.SectionAnswer;
import org.wardon.reference.ReferenceBook;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Says where it is warm and where cold in a chamber without a fan. */
@Command(
        name = "section",
        mixinStandardHelpOptions = true,
        description = {
            "Says where it is warm and where cold in a chest or chamber whose air no fan stirs, in a"
                    + " section cut upright through it, and draws it."
        })
final class Section implements Callable<Integer> {
    /** Pictures that are not SVG. */
    private static final List<String> OTHER_PICTURES =
            List.of(".png", ".jpg", ".jpeg", ".gif", ".pdf", ".webp");

    @Mixin private Shared shared = new Shared();

    @Mixin private ChamberQuestion asked = new ChamberQuestion();

    @Option(
            names = "--at",
            paramLabel = "TIME",
            description =
                    "End of the hours, local time such as 2026-03-04T15:00 (default: the warmest span"
                            + " outdoors with a lot inside).")
    private @Nullable String at;

    @Option(
            names = "--hours",
            paramLabel = "N",
            description =
                    "Mean of so many hours (default: 24, as a load feels them; 1 for one alone).")
    private int hours = SectionAdvice.USUAL_HOURS;

    @Option(
            names = "--across",
            paramLabel = "WAY",
            description =
                    "Cut west-east or south-north (default: where the faces are furthest apart).")
    private @Nullable String across;

    @Option(
            names = "--picture",
            paramLabel = "FILE",
            description = "Draw the section into this SVG file.")
    private @Nullable Path picture;

    @Override
    public Integer call() {
        Words words = shared.words();
        if (picture != null) {
            refuseOtherPictures(picture, words);
        }
        SectionAnswer answer;
        try (ReferenceBook book = shared.book()) {
            var store = asked.plan(shared, book);
            if (picture != null) {
                AtomicFile.tryOut(picture);
            }
            answer =
                    new SectionAdvice(book, words)
                            .ask(
                                    store,
                                    new SectionAdvice.Question(
                                            asked.chamber(),
                                            Optional.ofNullable(at),
                                            hours,
                                            Optional.ofNullable(across)));
        }
        if (picture != null) {
            String drawn = SectionPicture.of(answer, words);
            AtomicFile.write(picture, out -> out.write(drawn));
        }
        Optional<String> file = Optional.ofNullable(picture).map(Path::toString);
        asked.tell(answer, () -> new SectionPage(words).of(answer, file));
        return Exit.OK;
    }

    private static void refuseOtherPictures(Path file, Words words) {
        String name = file.toString().toLowerCase(Locale.ROOT);
        if (OTHER_PICTURES.stream().anyMatch(name::endsWith)) {
            throw new BadInput(
                    "--picture",
                    "",
                    words.text("section.other-picture").replace("{0}", file.toString()),
                    words.text("section.svg-only"));
        }
    }
}

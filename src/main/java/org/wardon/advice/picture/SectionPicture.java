package org.wardon.advice.picture;

import java.util.List;
import org.wardon.advice.wording.Units;
import org.wardon.advice.wording.Words;
import org.wardon.files.forecast.SectionAnswer;

/**
 * The picture of a section: temperatures in colour with their lines and numbers, the load outlined,
 * the warmest place marked by a triangle that stands and the coldest by one that hangs, faces named
 * with their temperatures, and a scale. Drawn 360 wide, so that it is legible on a phone.
 */
public final class SectionPicture {
    private static final double WIDTH = 360;
    private static final double LEFT = 66;
    private static final double TOP = 66;
    private static final double ACROSS = WIDTH - 2 * LEFT;
    private static final double LOWEST = 110;
    private static final double HIGHEST = 330;
    private static final int NUMBERS_ACROSS = 4;
    private static final double MARK = 7;

    private final SectionAnswer answer;
    private final Words words;
    private final Units units;
    private final double up;
    private final double leastC;
    private final double mostC;
    private final Svg svg = new Svg();

    private SectionPicture(SectionAnswer answer, Words words) {
        this.answer = answer;
        this.words = words;
        units = words.units();
        double even = ACROSS * answer.heightM() / answer.widthM();
        up = Math.min(HIGHEST, Math.max(LOWEST, even));
        double least = answer.coldest().temperatureC();
        double most = answer.warmest().temperatureC();
        double pad = Math.max(0, 0.5 - (most - least)) / 2;
        leastC = least - pad;
        mostC = most + pad;
    }

    /**
     * Returns the picture of an answer.
     *
     * @param answer the answer
     * @param words words and units of the person
     * @return SVG text that ends with a line feed
     */
    public static String of(SectionAnswer answer, Words words) {
        return new SectionPicture(answer, words).text();
    }

    private String text() {
        head();
        cells();
        lines();
        stack();
        numbers();
        frame();
        mark(answer.warmest(), true);
        mark(answer.coldest(), false);
        double below = legend(TOP + up + 34);
        double end = scale(below + 8);
        return opening(end) + svg.lines() + "</svg>\n";
    }

    private String opening(double height) {
        return new Svg()
                .add(
                        "<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 %s %s\""
                                + " role=\"img\" aria-labelledby=\"title\" aria-describedby=\"told\">",
                        WIDTH, height)
                .add("<title id=\"title\">%s</title>", Svg.safe(title()))
                .add(
                        "<desc id=\"told\">%s</desc>",
                        Svg.safe(String.join(" ", answer.said().subList(0, 2))))
                .add(
                        "<style>text{font-family:'DejaVu Sans',Verdana,sans-serif;fill:#1c2730}"
                                + ".head{font-size:15px;font-weight:bold}.line{font-size:12px}"
                                + ".number{font-size:12px;paint-order:stroke;stroke:#fff;"
                                + "stroke-width:3px;stroke-linejoin:round}"
                                + ".face{font-size:12px}.faceC{font-size:12px;font-weight:bold}"
                                + "</style>")
                .add("<rect width=\"%s\" height=\"%s\" fill=\"#fbfaf6\"/>", WIDTH, height)
                .lines();
    }

    private String title() {
        return words.text("section.title")
                .replace("{0}", answer.chamber())
                .replace("{1}", answer.at().toString().replace('T', ' '));
    }

    private void head() {
        svg.text(12, 22, "start", "head", title());
        String apart =
                words.text("section.apart")
                        .replace("{0}", units.figure(answer.hours(), "h"))
                        .replace("{1}", units.difference(answer.spreadK()));
        svg.text(12, 39, "start", "line", apart);
    }

    private double x(double metres) {
        return LEFT + ACROSS * metres / answer.widthM();
    }

    private double y(double metres) {
        return TOP + up * (1 - metres / answer.heightM());
    }

    private double share(double temperatureC) {
        return (temperatureC - leastC) / (mostC - leastC);
    }

    private void cells() {
        SectionAnswer.Field field = answer.field();
        svg.add("<g shape-rendering=\"crispEdges\">");
        for (int row = 0; row < field.rows(); row++) {
            List<String> shades =
                    field.temperatureC().get(row).stream().map(c -> Shades.of(share(c))).toList();
            int from = 0;
            for (int column = 1; column <= field.columns(); column++) {
                if (column == field.columns() || !shades.get(column).equals(shades.get(from))) {
                    run(row, from, column, shades.get(from));
                    from = column;
                }
            }
        }
        svg.add("</g>");
    }

    /** Cells of one row and one colour. */
    private void run(int row, int from, int to, String shade) {
        double wide = ACROSS / answer.field().columns();
        double high = up / answer.field().rows();
        svg.add(
                "<rect x=\"%s\" y=\"%s\" width=\"%s\" height=\"%s\" fill=\"%s\"/>",
                LEFT + from * wide, TOP + row * high, (to - from) * wide + 0.5, high + 0.5, shade);
    }

    private void lines() {
        SectionAnswer.Field field = answer.field();
        double wide = ACROSS / field.columns();
        double high = up / field.rows();
        Isotherms isotherms = new Isotherms(field.temperatureC());
        svg.add("<g fill=\"none\" stroke=\"#1c2730\" stroke-width=\"0.8\" stroke-opacity=\"0.6\">");
        for (double level : levels()) {
            StringBuilder path = new StringBuilder();
            for (double[] piece : isotherms.line(level, units::shown).pieces()) {
                path.append('M').append(Svg.number(LEFT + wide * piece[0]));
                path.append(' ').append(Svg.number(TOP + high * piece[1]));
                path.append('L').append(Svg.number(LEFT + wide * piece[2]));
                path.append(' ').append(Svg.number(TOP + high * piece[3]));
            }
            if (!path.isEmpty()) {
                svg.add("<path d=\"%s\"/>", path);
            }
        }
        svg.add("</g>");
    }

    private List<Double> levels() {
        return Isotherms.levels(units.shown(leastC), units.shown(mostC));
    }

    private void stack() {
        answer.stack()
                .ifPresent(
                        stack -> {
                            double x = x(stack.fromM());
                            double y = y(stack.topM());
                            double wide = x(stack.toM()) - x;
                            double high = y(stack.footM()) - y;
                            svg.add(
                                    "<rect x=\"%s\" y=\"%s\" width=\"%s\" height=\"%s\" fill=\"none\""
                                            + " stroke=\"#1c2730\" stroke-width=\"1.6\""
                                            + " stroke-dasharray=\"6 3\"/>",
                                    x, y, wide, high);
                            svg.text(x + 5, y + 13, "start", "number", words.text("section.load"));
                        });
    }

    /** Numbers on an even grid; none where a mark stands, whose number the legend tells. */
    private void numbers() {
        SectionAnswer.Field field = answer.field();
        int rows = Math.max(2, (int) Math.round(up / 52));
        for (int i = 0; i < rows; i++) {
            for (int j = 0; j < NUMBERS_ACROSS; j++) {
                number(middle(i, rows, field.rows()), middle(j, NUMBERS_ACROSS, field.columns()));
            }
        }
    }

    /** The cell in the middle of a part of many. */
    private static int middle(int part, int parts, int cells) {
        return (int) Math.round((part + 0.5) * cells / parts - 0.5);
    }

    private void number(int row, int column) {
        SectionAnswer.Field field = answer.field();
        double x = LEFT + ACROSS * (column + 0.5) / field.columns();
        double y = TOP + up * (row + 0.5) / field.rows();
        if (clear(x, y, answer.warmest()) && clear(x, y, answer.coldest()) && offLabel(x, y)) {
            String told = units.degrees(field.temperatureC().get(row).get(column));
            svg.text(x, y + 4, "middle", "number", told);
        }
    }

    private boolean clear(double x, double y, SectionAnswer.Place place) {
        return Math.abs(x - markX(place)) > 24 || Math.abs(y - markY(place)) > 14;
    }

    /** Whether a number stays off the word at the upper left of the load. */
    private boolean offLabel(double x, double y) {
        return answer.stack()
                .map(
                        stack ->
                                Math.abs(x - x(stack.fromM()) - 20) > 36
                                        || Math.abs(y - y(stack.topM()) - 9) > 16)
                .orElse(true);
    }

    private double markX(SectionAnswer.Place place) {
        return Math.min(LEFT + ACROSS - MARK - 3, Math.max(LEFT + MARK + 3, x(place.xM())));
    }

    private double markY(SectionAnswer.Place place) {
        return Math.min(TOP + up - MARK - 3, Math.max(TOP + MARK + 3, y(place.yM())));
    }

    private void mark(SectionAnswer.Place place, boolean stands) {
        triangle(markX(place), markY(place), stands);
    }

    private void triangle(double x, double y, boolean stands) {
        double tip = stands ? -MARK : MARK;
        svg.add(
                "<path d=\"M%s %sL%s %sL%s %sZ\" fill=\"#fff\" stroke=\"#1c2730\""
                        + " stroke-width=\"1.8\"/>",
                x, y + tip, x + MARK, y - tip * 0.75, x - MARK, y - tip * 0.75);
    }

    private void frame() {
        svg.add(
                "<rect x=\"%s\" y=\"%s\" width=\"%s\" height=\"%s\" fill=\"none\""
                        + " stroke=\"#4a5358\" stroke-width=\"4\"/>",
                LEFT - 2, TOP - 2, ACROSS + 4, up + 4);
        for (SectionAnswer.OfFace face : answer.faces()) {
            String name = words.text("section.face." + face.face());
            String told = units.temperature(face.innerC());
            switch (face.side()) {
                case "left" -> beside(LEFT - 8, "end", name, told);
                case "right" -> beside(LEFT + ACROSS + 8, "start", name, told);
                case "floor" -> flat(TOP + up + 18, name, told);
                default -> flat(TOP - 8, name, told);
            }
        }
    }

    private void beside(double x, String anchor, String name, String told) {
        double middle = TOP + up / 2;
        svg.text(x, middle - 3, anchor, "face", name);
        svg.text(x, middle + 12, anchor, "faceC", told);
    }

    private void flat(double y, String name, String told) {
        svg.add(
                "<text x=\"%s\" y=\"%s\" text-anchor=\"middle\" class=\"face\">%s <tspan"
                        + " font-weight=\"bold\">%s</tspan></text>",
                WIDTH / 2, y, Svg.safe(name), Svg.safe(told));
    }

    /** The two marks and what they stand for; returns where it ends. */
    private double legend(double from) {
        triangle(22, from + 10, true);
        told(from + 8, "section.warmest", answer.warmest());
        triangle(22, from + 46, false);
        told(from + 44, "section.coldest", answer.coldest());
        return from + 68;
    }

    private void told(double y, String key, SectionAnswer.Place place) {
        String value = words.text(key) + " " + units.temperature(place.temperatureC());
        svg.text(38, y, "start", "faceC", value);
        svg.text(38, y + 16, "start", "line", place.where());
    }

    /** The scale of the colours; returns where it ends. */
    private double scale(double from) {
        int steps = 40;
        double wide = (WIDTH - 2 * 20) / steps;
        svg.add("<g shape-rendering=\"crispEdges\">");
        for (int i = 0; i < steps; i++) {
            svg.add(
                    "<rect x=\"%s\" y=\"%s\" width=\"%s\" height=\"10\" fill=\"%s\"/>",
                    20 + i * wide, from, wide + 0.5, Shades.of((i + 0.5) / steps));
        }
        svg.add("</g>");
        double least = units.shown(leastC);
        double most = units.shown(mostC);
        for (double level : levels()) {
            double x = 20 + (WIDTH - 2 * 20) * (level - least) / (most - least);
            svg.add(
                    "<path d=\"M%s %sV%s\" stroke=\"#1c2730\" stroke-width=\"1\"/>",
                    x, from, from + 13);
            svg.text(x, from + 25, "middle", "line", Svg.number(level));
        }
        svg.text(
                20,
                from + 42,
                "start",
                "line",
                words.text(scaleKey()).replace("{0}", Svg.number(step())));
        return from + 52;
    }

    private double step() {
        List<Double> levels = levels();
        return levels.size() < 2 ? 0 : levels.get(1) - levels.get(0);
    }

    private String scaleKey() {
        return units.fahrenheit() ? "section.scale-f" : "section.scale-c";
    }
}

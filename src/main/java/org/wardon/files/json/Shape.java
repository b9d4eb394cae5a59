package org.wardon.files.json;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a place of a tree may hold, as the schema says it, ready to make a form of. Whoever shows
 * shapes needs no name of any plan: a kind that is added to the schema shows by itself.
 */
public sealed interface Shape {
    /**
     * A number.
     *
     * @param unit its unit, empty where it has none
     * @param low least accepted
     * @param high most accepted
     * @param whole whether it counts
     * @param usual what stands where nothing is given; empty where that depends on other figures
     */
    record Figure(String unit, double low, double high, boolean whole, OptionalDouble usual)
            implements Shape {}

    /**
     * One of some words.
     *
     * @param words the words
     * @param usual the one that stands where nothing is given
     */
    record Words(List<String> words, Optional<String> usual) implements Shape {
        /** Copies the list. */
        public Words {
            words = List.copyOf(words);
        }
    }

    /**
     * A text.
     *
     * @param form {@code localDateTime}, {@code localDate}, {@code localTime}, {@code zone}, or
     *     empty for free text
     * @param longest most characters, 0 where nothing says
     * @param usual what stands where nothing is given
     */
    record Line(String form, int longest, Optional<String> usual) implements Shape {}

    /**
     * True or false.
     *
     * @param usual which where nothing is given, empty where that is another answer
     */
    record YesNo(Optional<Boolean> usual) implements Shape {}

    /**
     * Names with their values.
     *
     * @param members the names
     */
    record Group(List<Member> members) implements Shape {
        /** Copies the list. */
        public Group {
            members = List.copyOf(members);
        }

        /**
         * Returns a member.
         *
         * @param name its name
         * @return its shape, absent where there is no such name
         */
        public Optional<Shape> member(String name) {
            return members.stream()
                    .filter(one -> one.name().equals(name))
                    .map(Member::shape)
                    .findFirst();
        }
    }

    /**
     * A name of a group.
     *
     * @param name the name
     * @param required whether it must be given
     * @param shape what it may hold
     * @param hint what the schema says of it
     */
    record Member(String name, boolean required, Shape shape, String hint) {}

    /**
     * Values under ids of the person's own.
     *
     * @param of what each may hold
     */
    record Named(Shape of) implements Shape {}

    /**
     * A list.
     *
     * @param of what each item may hold
     * @param least fewest items
     * @param most most items
     */
    record Listed(Shape of, int least, int most) implements Shape {}

    /**
     * One of several.
     *
     * @param options which
     */
    record Choice(List<Option> options) implements Shape {
        /** Copies the list. */
        public Choice {
            options = List.copyOf(options);
        }

        /**
         * Returns an option.
         *
         * @param word its word
         * @return the option, absent where there is none
         */
        public Optional<Option> option(String word) {
            return options.stream().filter(one -> one.word().equals(word)).findFirst();
        }
    }

    /**
     * An option.
     *
     * @param word the word it is chosen by
     * @param by how the JSON tells it
     * @param shape what it holds; a {@link Fixed} where the word says it all
     * @param hint what the schema says of it
     */
    record Option(String word, By by, Shape shape, String hint) {}

    /** How the JSON tells which option was chosen. */
    enum By {
        /** It is the word itself. */
        WORD,
        /** It is a group with this one name. */
        NAME,
        /** It is a group whose {@code kind} is the word. */
        KIND,
        /** It is a value of another type. */
        TYPE
    }

    /**
     * Nothing to be filled in.
     *
     * @param json what stands there
     */
    record Fixed(String json) implements Shape {}

    /**
     * Returns the least that a place may begin with: what is fixed, what must be given of groups,
     * nothing else.
     *
     * @return JSON text
     */
    default String blank() {
        return Shapes.blank(this);
    }

    /**
     * Returns the shape at a path, whatever stands in the tree on the way.
     *
     * @param path the path
     * @param tree the whole tree, to tell which option of a choice was taken
     * @return the shape, absent where there is none
     */
    default Optional<Shape> at(JsonPath path, Json tree) {
        return Shapes.at(this, path, tree);
    }
}

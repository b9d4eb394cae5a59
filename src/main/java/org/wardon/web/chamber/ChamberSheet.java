package org.wardon.web.chamber;

import java.util.List;
import java.util.Optional;
import org.wardon.web.pages.ChamberView;
import org.wardon.web.pages.ChartView;
import org.wardon.web.pages.FieldView;
import org.wardon.web.pages.TableView;

/**
 * The page of a chamber.
 *
 * @param path its path
 * @param id the chamber
 * @param plan number of the plan
 * @param chamber the chamber as on the page of all chambers
 * @param slides fields of what could be changed
 * @param answer the chamber with something changed
 * @param charts its air and gases
 * @param limits limits of carbon dioxide, with their sources
 * @param heat what heats it
 * @param face temperatures through a face
 * @param lots a chart a lot, or that of the lot chosen
 * @param picks lots to choose from where there are too many for a chart each
 * @param section path of the section, where no fan stirs the air
 * @param laterSettings whether its plan changes its setting on the way
 */
public record ChamberSheet(
        String path,
        String id,
        long plan,
        ChamberView chamber,
        List<WhatIfForm.Slide> slides,
        Optional<WhatIfView> answer,
        List<ChartView> charts,
        List<String> limits,
        Drawing heat,
        FaceSheet face,
        List<ChartView> lots,
        List<Pick> picks,
        Optional<String> section,
        boolean laterSettings) {
    /** Copies the lists. */
    public ChamberSheet {
        slides = List.copyOf(slides);
        charts = List.copyOf(charts);
        limits = List.copyOf(limits);
        lots = List.copyOf(lots);
        picks = List.copyOf(picks);
    }

    /**
     * A drawing.
     *
     * @param svg the drawing
     * @param told what it shows
     * @param legend its bands: id of the pattern and name; or its layers
     * @param table the same in numbers
     */
    public record Drawing(String svg, String told, List<Mark> legend, TableView table) {
        /** Copies the list. */
        public Drawing {
            legend = List.copyOf(legend);
        }
    }

    /**
     * A band in a legend.
     *
     * @param id id of its pattern
     * @param name its name
     */
    public record Mark(String id, String name) {}

    /**
     * Temperatures through a face at an hour.
     *
     * @param faces faces to choose from
     * @param at the hour
     * @param least first hour there is
     * @param most last
     * @param before the hour before, blank where there is none
     * @param after the hour after, blank where there is none
     * @param drawing the drawing; absent where a fault stands at the hour
     */
    public record FaceSheet(
            List<Pick> faces,
            FieldView at,
            String least,
            String most,
            String before,
            String after,
            Optional<Drawing> drawing) {
        /** Copies the list. */
        public FaceSheet {
            faces = List.copyOf(faces);
        }
    }

    /**
     * A choice.
     *
     * @param word what is sent
     * @param name what is read
     * @param taken whether it is chosen
     */
    public record Pick(String word, String name, boolean taken) {}
}

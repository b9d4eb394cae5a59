package org.wardon.advice.crops;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.wardon.produce.Commodity;
import org.wardon.produce.Reason;
import org.wardon.produce.rows.RipeningRow;
import org.wardon.reference.ReferenceBook;

/**
 * What is known of one crop.
 *
 * @param commodity the crop, with the rows of the variant where one was chosen
 * @param variants variants that can be chosen, names of the sources by id
 * @param variant the one chosen and what is its own; empty for the crop as a whole
 * @param facts every fact, own ones first
 * @param life life over temperature
 * @param cold cold that injures it, by ripeness; none where it does not chill
 * @param breath heat of respiration over temperature
 * @param ripening printed days of ripening; none where there is no print
 */
public record CropSheet(
        Commodity commodity,
        Map<String, String> variants,
        Optional<Reason> variant,
        List<SheetFact> facts,
        LifeLine life,
        List<ColdZone> cold,
        BreathLine breath,
        List<RipeningRow> ripening) {
    /** Copies the lists. */
    public CropSheet {
        facts = List.copyOf(facts);
        cold = List.copyOf(cold);
        ripening = List.copyOf(ripening);
    }

    /**
     * Returns the sheet of a crop. To make several, keep one {@link CropSheets}.
     *
     * @param commodity id or any common name
     * @param variant a variant of it; empty for the crop as a whole
     * @param book the tables, with the keeper's own values laid over them
     * @return the sheet
     * @throws org.wardon.errors.BadInput if nothing is called so
     */
    public static CropSheet of(String commodity, Optional<String> variant, ReferenceBook book) {
        return new CropSheets(book).of(commodity, variant);
    }
}

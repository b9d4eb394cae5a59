package org.wardon.web.crops;

import org.wardon.advice.crops.CropSearch;
import org.wardon.advice.crops.CropSheets;
import org.wardon.advice.outlook.KeepingAdvice;
import org.wardon.advice.outlook.OwnLotAdvice;
import org.wardon.reference.ReferenceBook;

/**
 * What answers questions about crops, prepared once a book.
 *
 * @param book the book
 * @param search finds crops
 * @param sheets what is known of them
 * @param keeping how long a lot keeps
 * @param lots own lots that are gone
 */
record CropDesk(
        ReferenceBook book,
        CropSearch search,
        CropSheets sheets,
        KeepingAdvice keeping,
        OwnLotAdvice lots) {
    static CropDesk of(ReferenceBook book) {
        return new CropDesk(
                book,
                new CropSearch(book),
                new CropSheets(book),
                new KeepingAdvice(book),
                new OwnLotAdvice(book));
    }
}

/** The pages in a browser. */
@NullMarked
package org.wardon.web.browser;

import org.jspecify.annotations.NullMarked;

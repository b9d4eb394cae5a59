package org.wardon.web.pages;

import org.wardon.web.guard.Refusal;

/** Style, script, charts and the mark. */
public final class StaticFiles {
    private final Assets assets;

    /**
     * Serves these.
     *
     * @param assets the files
     */
    public StaticFiles(Assets assets) {
        this.assets = assets;
    }

    /**
     * Gives one away, to be kept for good.
     *
     * @param call the request
     */
    public void give(Call call) {
        Assets.Asset asset =
                assets.find(call.http().path()).orElseThrow(() -> new Refusal(404, "nothing-here"));
        call.http()
                .header("Cache-Control", "public, max-age=31536000, immutable")
                .contentType(asset.type())
                .result(asset.content());
    }
}

package org.fallwright.core.plan;

import java.util.List;
import java.util.Map;
import org.fallwright.core.anchor.AnchorFigures;
import org.fallwright.core.line.LegLoads;
import org.fallwright.core.line.LineFigures;
import org.fallwright.core.line.Point3;
import org.fallwright.core.line.RatedFigures;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.reference.Species;
import org.fallwright.core.site.Gear;
import org.fallwright.core.statics.PullCase;
import org.fallwright.core.statics.Ratios;
import org.fallwright.core.statics.Statics;
import org.fallwright.core.tree.TreeFigures;

/**
 * A judged setup with all that its figures were reckoned from, for whoever works them again.
 *
 * @param judged the setup as judged
 * @param species the tree's species
 * @param tree the tree's figures, entered and derived
 * @param pull what the force balance was given
 * @param statics the force balance
 * @param points attachment, redirects, end; metres from the stump's centre at hinge level
 * @param loads tensions and loads of the legs
 * @param redirectBlock the redirect block; null: no redirect
 * @param line the pull line as it is rigged
 * @param rated what the rated hardware may carry, by the part's name
 * @param offer what the source gives at its line end
 * @param ratios ratios after any stop; null where the tree cannot be moved
 * @param anchors anchors of the way
 * @param anchorFigures tables that the anchors were reckoned from
 */
public record Reckoned(
    Judged judged,
    Species species,
    TreeFigures tree,
    PullCase pull,
    Statics statics,
    List<Point3> points,
    LegLoads loads,
    Gear.Block redirectBlock,
    LineFigures line,
    Map<String, RatedFigures> rated,
    PullOffer offer,
    Ratios ratios,
    List<HeldAnchor> anchors,
    AnchorFigures anchorFigures) {}

package saltspoke.advice;

import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.WheelBuild;

/**
 * A question about wheels at one place.
 *
 * @param profile how the bicycle is ridden and kept
 * @param build spokes, tension, tape, seat
 * @param rim catalogue id, or null for all
 * @param nipple catalogue id, or null for all
 * @param between interface id, or null for all
 * @param spoke catalogue id, or null for all
 * @param risk accepted risk
 * @param buildMonth calendar month in which the wheel went or goes into service, 1..12
 * @param ageMonths age of the wheel now, 0 for a new one, 0..240
 * @param lastFinding what the last look found; {@code NOT_LOOKED} for a new wheel
 * @param practiceLimits whether intervals are held within the limits of common practice
 */
public record AdviceRequest(
    RidingProfile profile,
    WheelBuild build,
    String rim,
    String nipple,
    String between,
    String spoke,
    RiskLevel risk,
    int buildMonth,
    double ageMonths,
    Finding lastFinding,
    boolean practiceLimits) {}

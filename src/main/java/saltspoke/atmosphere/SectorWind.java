package saltspoke.atmosphere;

/**
 * How a month's wind is spread over directions and speeds, when only its mean vector and mean speed
 * are known. ASSUMPTION: hourly wind vectors are normal about the mean vector with the same
 * deviation σ along and across it; speeds from all sides alike then follow Rayleigh's law. σ comes
 * from the mean speed s and the mean vector's length m by s² = m² + (π/2)·σ², exact for m = 0 and
 * within 6 % of s otherwise.
 */
final class SectorWind {
  /**
   * ASSUMPTION: the mean vector is at most this share of the mean speed; trades reach 0.9 (from
   * memory).
   */
  private static final double MAX_CONSTANCY = 0.9;

  private final double meanVectorMPerS;
  private final double towardsEast;
  private final double towardsNorth;
  private final double sigmaMPerS;

  SectorWind(WindMonth wind) {
    double speed = wind.meanSpeedMPerS();
    double vector = Math.hypot(wind.eastwardMPerS(), wind.northwardMPerS());
    meanVectorMPerS = Math.min(vector, MAX_CONSTANCY * speed);
    towardsEast = vector > 0 ? wind.eastwardMPerS() / vector : 0;
    towardsNorth = vector > 0 ? wind.northwardMPerS() / vector : 0;
    sigmaMPerS = Math.sqrt((speed * speed - meanVectorMPerS * meanVectorMPerS) * 2 / Math.PI);
  }

  /**
   * Mean over the hours of exp(growth·(v − reference)) where v is above the threshold and blows
   * from this direction, else 0, per radian of direction.
   *
   * @param fromAzimuthDeg direction that the wind comes from, degrees clockwise from north
   * @param thresholdMPerS slower wind counts nothing
   * @param growthPerMPerS growth with speed, s/m; 0 counts time only
   * @param referenceMPerS speed at which the weight is 1
   */
  double carriedPerRadian(
      double fromAzimuthDeg, double thresholdMPerS, double growthPerMPerS, double referenceMPerS) {
    double azimuth = Math.toRadians(fromAzimuthDeg);
    return carriedPerRadian(
        Math.sin(azimuth), Math.cos(azimuth), thresholdMPerS, growthPerMPerS, referenceMPerS);
  }

  /** The same for a direction whose sine and cosine are known. */
  double carriedPerRadian(
      double sinAzimuth,
      double cosAzimuth,
      double thresholdMPerS,
      double growthPerMPerS,
      double referenceMPerS) {
    double cosine = -(towardsEast * sinAzimuth + towardsNorth * cosAzimuth);
    double s2 = sigmaMPerS * sigmaMPerS;
    double centre = meanVectorMPerS * cosine + growthPerMPerS * s2;
    double lead =
        Math.exp(
                (centre * centre - meanVectorMPerS * meanVectorMPerS) / (2 * s2)
                    - growthPerMPerS * referenceMPerS)
            / (2 * Math.PI * s2);
    double excess = (thresholdMPerS - centre) / sigmaMPerS;
    return lead
        * (s2 * Math.exp(-excess * excess / 2)
            + centre * sigmaMPerS * Math.sqrt(Math.PI / 2) * NormalLaw.erfc(excess / Math.sqrt(2)));
  }
}

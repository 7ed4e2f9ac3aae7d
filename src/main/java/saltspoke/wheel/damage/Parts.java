package saltspoke.wheel.damage;

import saltspoke.wheel.Nipple;
import saltspoke.wheel.Rim;
import saltspoke.wheel.SeatInterface;
import saltspoke.wheel.Spoke;

/** The catalogue entries of one pairing. */
public record Parts(Rim rim, Nipple nipple, SeatInterface between, Spoke spoke) {}

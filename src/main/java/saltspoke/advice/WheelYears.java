package saltspoke.advice;

import saltspoke.atmosphere.AirClimate;
import saltspoke.wheel.RidingProfile;
import saltspoke.wheel.WheelBuild;
import saltspoke.wheel.WheelYear;

/** Where the films in the rim come from: the wheel's own weather, or a test's hand. */
@FunctionalInterface
interface WheelYears {
  WheelYear over(AirClimate air, RidingProfile profile, WheelBuild build);
}

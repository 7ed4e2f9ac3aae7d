package saltspoke.advice;

/** What becomes of a wheel, mildest first; each is reached before or with the next. */
enum State {
  ATTACKED,
  SEIZED,
  LOST
}

package spanwright.rigging;

/**
 * What bears on the feedpoint: centre piece and its share of the feed line.
 *
 * @param bare weight without ice [N]
 * @param iced weight under ice [N]
 * @param barePush of the whole gust on the line without ice [N]
 * @param icedPush of the whole gust on the iced line [N]
 */
record FeedLoad(double bare, double iced, double barePush, double icedPush) {
  static final FeedLoad NONE = new FeedLoad(0, 0, 0, 0);

  double weight(Weather weather) {
    return weather.iced ? iced : bare;
  }

  double push(Weather weather) {
    return weather.windShare * (weather.iced ? icedPush : barePush);
  }
}

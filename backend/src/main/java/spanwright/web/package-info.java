/**
 * The HTTP side: the page's files, plans, searches, assessments and sheets.
 *
 * <p>Everything is JSON under {@code /api} as {@code docs/reference/api.md} describes it; every
 * error is a problem document (RFC 9457) whose detail is a sentence that says what is wrong, where,
 * and what to do, and never names anything inside the program.
 *
 * <p>Nothing is let in that was not asked for. The server answers on the loopback address only; a
 * request must name this server in {@code Host}, and in {@code Origin} where there is one, so that
 * a page from elsewhere in the same browser can neither read nor write. Any other address has to be
 * asked for and then every request needs the token that was printed with the address. Bodies, JSON
 * depth, numbers, time, searches and event streams are all bounded.
 *
 * <p>Who does what: {@code Gate} lets requests in or not; {@code Routes} classes, one for each kind
 * of thing, turn a request into a call of the packages below and its answer into JSON; {@code
 * Searches} runs searches beside the requests and keeps the last few; {@code EventStream} tells a
 * browser about one as it goes. Nothing here reckons anything.
 *
 * <p>Front door: {@link spanwright.web.WebServer}. {@code JsonText} and {@code PlacementReader}
 * also serve the command line, so that both refuse alike.
 */
package spanwright.web;

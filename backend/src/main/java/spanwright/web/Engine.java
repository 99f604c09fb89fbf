package spanwright.web;

/** What the routes ask of the packages that reckon; tests put a slow or failing one here. */
class Engine {}

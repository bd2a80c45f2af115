// The worker of the search's tests: the server's own, but a search for certain words ends it first.
// The order of these lines is the order in which a message is heard.
import './end-on-request.ts';
import '../worker.ts';

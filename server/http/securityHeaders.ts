/** helmet with a policy that lets the page load only what this server sent. */
import helmet from 'helmet';

export const securityHeaders = helmet({
  contentSecurityPolicy: {
    useDefaults: false,
    directives: {
      defaultSrc: ["'none'"],
      scriptSrc: ["'self'"],
      styleSrc: ["'self'"],
      // React and the drawing code set style attributes through the DOM, which this policy does not touch.
      imgSrc: ["'self'", 'data:', 'blob:'],
      fontSrc: ["'self'"],
      connectSrc: ["'self'"],
      workerSrc: ["'self'"],
      manifestSrc: ["'self'"],
      formAction: ["'self'"],
      frameAncestors: ["'none'"],
      baseUri: ["'none'"],
      objectSrc: ["'none'"],
    },
  },
  // Served over plain HTTP on loopback by default; a balancer with TLS adds its own.
  strictTransportSecurity: false,
  referrerPolicy: { policy: 'no-referrer' },
});

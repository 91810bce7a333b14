// What a module gives that the client leaves out (metro.left-out.cjs): under every name a part that fails when used.
function leftOut() {
  throw new Error('The client leaves this part out: see metro.left-out.cjs.');
}

module.exports = new Proxy({}, { get: (_parts, name) => (name === '__esModule' ? true : leftOut) });

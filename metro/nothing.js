/**
 * Stands in for a library's module that no page of ours uses but that the library loads all the same: whatever is called,
 * made or read from it gives itself again, so that a module that only prepares something with it at start still loads.
 */
const nothing = new Proxy(function nothing() {}, {
  get: (target, name) => {
    if (name === '__esModule') return true;
    if (name === 'prototype') return target.prototype;
    return typeof name === 'symbol' ? undefined : nothing;
  },
  apply: () => nothing,
  construct: () => ({}),
  set: () => true,
});

module.exports = nothing;

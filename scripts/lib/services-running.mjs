/** Keeps what was started, so that all of it can be ended in the opposite order. */
export function runningServices() {
  const services = [];
  return {
    /** @template {{stop: () => Promise<void>}} T @param {T} service @returns {T} */
    add(service) {
      services.push(service);
      return service;
    },
    /** Resolves with the reason when one of them ends although nobody stopped it. */
    async firstFailure() {
      const endings = services
        .filter((service) => service.ended)
        .map(async (service) => {
          await service.ended;
          return service.failure() ?? new Promise(() => {}); // stopped by us: no failure
        });
      return Promise.race(endings);
    },
    async stopAll() {
      for (const service of services.splice(0).reverse()) await service.stop();
    },
  };
}

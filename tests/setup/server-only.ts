/** The marker package throws outside the framework; tests run server code on purpose. */
export {};

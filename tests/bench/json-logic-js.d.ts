/** The package brings no types; what the bench asks of it. */
declare module 'json-logic-js' {
  const jsonLogic: { apply(rule: unknown, data?: unknown): unknown };
  export default jsonLogic;
}

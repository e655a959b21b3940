/** The few parts of the oracle's interface that the tests use; the package carries no types. */
declare module '@observablehq/runtime' {
  export interface Variable {
    define(name: string, inputs: readonly string[], definition: unknown): Variable;
  }

  export interface Module {
    variable(observer?: object): Variable;
    value(name: string): Promise<unknown>;
  }

  export class Runtime {
    module(): Module;
    dispose(): void;
  }
}

/** The few names that the page takes from Vega's parts, which ship without types of their own. */
declare module 'vega-dataflow' {
  export const transforms: Record<string, unknown>;
}
declare module 'vega-encode';
declare module 'vega-transforms';
declare module 'vega-view-transforms' {
  export const bound: unknown;
  export const mark: unknown;
  export const overlap: unknown;
  export const render: unknown;
  export const viewlayout: unknown;
}
declare module 'vega-scenegraph' {
  export const textMetrics: {
    width: (item: { readonly fontSize?: number; readonly fontWeight?: string | number }, text: unknown) => number;
  };
}
declare module 'vega-parser' {
  export function parse(spec: object, config?: object, options?: { readonly ast: boolean }): object;
}
declare module 'vega-view' {
  interface Item {
    readonly datum?: Record<string, unknown>;
  }
  export class View {
    constructor(runtime: object, options: object);
    tooltip(handler: (handler: unknown, event: MouseEvent, item: Item | null, value: unknown) => void): this;
    runAsync(): Promise<this>;
    signal(name: string, value: unknown): this;
    data(name: string): readonly Record<string, unknown>[];
    width(value: number): this;
    addEventListener(type: string, handler: (event: Event, item: Item | null) => void): this;
    finalize(): this;
  }
}

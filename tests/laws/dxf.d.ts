/** The part of the second reader that the laws use; the package brings no types. */
declare module "dxf" {
  interface ReadEntity {
    readonly type: string;
    readonly layer: string;
    readonly closed?: boolean;
    readonly vertices?: readonly { readonly x: number; readonly y: number; readonly bulge?: number }[];
    readonly r?: number;
  }
  export class Helper {
    constructor(text: string);
    readonly parsed: { readonly entities: readonly ReadEntity[]; readonly header: { readonly insUnits?: number } };
  }
}

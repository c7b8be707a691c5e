/** The part of the validator that the laws use; the package brings no types. */
declare module "gltf-validator" {
  const validator: { validateBytes(data: Uint8Array): Promise<{ readonly issues: { readonly numErrors: number; readonly numWarnings: number } }> };
  export default validator;
}

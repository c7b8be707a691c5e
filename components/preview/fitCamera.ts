import { Vector3, type OrthographicCamera } from "three";
import type { FitTarget } from "./FitView";

/** Moves a camera so that a sphere fills `pixels`, seen from `direction`. */
export function fitCamera(
  camera: OrthographicCamera,
  controls: { readonly target: Vector3; readonly update: () => unknown },
  { centre, radius }: FitTarget,
  direction: Vector3,
  pixels: number,
): void {
  const middle = new Vector3(...centre);
  camera.position.copy(middle).addScaledVector(direction.clone().normalize(), radius * 6 + 2500);
  camera.zoom = pixels / (2 * radius);
  camera.near = 0.1;
  camera.far = radius * 20 + 10_000;
  camera.lookAt(middle);
  camera.updateProjectionMatrix();
  controls.target.copy(middle);
  controls.update();
}

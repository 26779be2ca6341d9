/** A place on the screen as a place of the drawing, which stands in its box as large as it fits, in the middle. */
export function tapIn(
  box: { readonly left: number; readonly top: number; readonly width: number; readonly height: number },
  scene: { readonly width: number; readonly height: number },
  at: { readonly clientX: number; readonly clientY: number },
): readonly [number, number] {
  const scale = Math.min(box.width / scene.width, box.height / scene.height);
  const left = box.left + (box.width - scene.width * scale) / 2;
  const top = box.top + (box.height - scene.height * scale) / 2;
  return [(at.clientX - left) / scale, (at.clientY - top) / scale];
}

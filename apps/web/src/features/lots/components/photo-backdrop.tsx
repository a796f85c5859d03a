import { photoBox, type SidePhoto } from '../side-photo.ts';

/** A photo true to scale, under what is drawn. */
export function PhotoBackdrop({ photo, strength }: { photo: SidePhoto; strength: number }) {
  return (
    <image
      href={photo.url}
      {...photoBox(photo)}
      preserveAspectRatio="none"
      opacity={strength / 100}
      aria-hidden="true"
    />
  );
}

/** Why there is no camera to open, before asking for one. */
class NoCamera extends Error {}

const sentences: Record<string, string> = {
  NotAllowedError:
    'It was refused to this page. Allow the camera in the browser’s settings for this address, or type the tag.',
  NotFoundError: 'This device has no camera. Type the tag, or use a hand scanner.',
  NotReadableError: 'Another program has it. Close that one and try again, or type the tag.',
};

const onlySecure =
  'Browsers open the camera only on https or on this computer itself. Ask the owner for the shop’s https address, or type the tag.';

/** What stands in the way, and what to do instead. */
export function whyNoCamera(error: unknown): string {
  if (error instanceof NoCamera) return error.message;
  const known = error instanceof DOMException ? sentences[error.name] : undefined;
  return known ?? 'It did not start. Close it and try again, or type the tag.';
}

/** Shows the rear camera, where there is one, until the signal says that it is closed. */
export async function openCamera(video: HTMLVideoElement, closed: AbortSignal): Promise<void> {
  if (!window.isSecureContext) throw new NoCamera(onlySecure);
  // Older browsers have none, whatever their types say.
  const devices = navigator.mediaDevices as MediaDevices | undefined;
  if (devices === undefined) throw new NoCamera(sentences['NotFoundError']);
  const stream = await devices.getUserMedia({ video: { facingMode: 'environment' }, audio: false });
  const stop = () => stream.getTracks().forEach((track) => track.stop());
  if (closed.aborted) return stop();
  closed.addEventListener('abort', stop);
  video.srcObject = stream;
  await video.play();
}

const longestSide = 640;
/** The same code lying before the camera is read once in this time. */
const againMs = 2500;

/** Looks for a code in picture after picture. */
export async function readCodes(
  video: HTMLVideoElement,
  closed: AbortSignal,
  onRead: (text: string) => void,
): Promise<void> {
  const { default: jsQR } = await import('jsqr');
  const pen = document.createElement('canvas').getContext('2d', { willReadFrequently: true });
  if (pen === null) throw new Error('This browser cannot draw');
  let last = { text: '', at: -Infinity };

  function look(at: number): void {
    if (closed.aborted || pen === null) return;
    const picture = pictureOf(video, pen);
    const text = picture && jsQR(picture.data, picture.width, picture.height)?.data;
    if (text && (text !== last.text || at - last.at > againMs)) {
      last = { text, at };
      onRead(text);
    }
    requestAnimationFrame(look);
  }
  requestAnimationFrame(look);
}

function pictureOf(video: HTMLVideoElement, pen: CanvasRenderingContext2D): ImageData | undefined {
  const { videoWidth, videoHeight } = video;
  if (videoWidth === 0 || videoHeight === 0) return undefined;
  const scale = Math.min(1, longestSide / Math.max(videoWidth, videoHeight));
  const [width, height] = [Math.round(videoWidth * scale), Math.round(videoHeight * scale)];
  pen.canvas.width = width;
  pen.canvas.height = height;
  pen.drawImage(video, 0, 0, width, height);
  return pen.getImageData(0, 0, width, height);
}

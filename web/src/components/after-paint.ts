/**
 * Does something once `delay` ms have gone and what stands to be painted then is painted: work that takes longer than a
 * frame holds up nothing that a person waits for. Returns how to leave it.
 */
export function afterPaint(delay: number, work: () => void): () => void {
  let frame = 0;
  let timer = setTimeout(() => {
    frame = requestAnimationFrame(() => {
      timer = setTimeout(work);
    });
  }, delay);
  return () => {
    clearTimeout(timer);
    cancelAnimationFrame(frame);
  };
}

export const menuLook = {
  popup: 'min-w-52 rounded border border-stitch bg-card p-1.5 shadow-top outline-none',
  item: 'flex min-h-11 cursor-pointer items-center gap-3 rounded px-3 outline-none data-highlighted:bg-verdigris-pale data-highlighted:text-ink',
};

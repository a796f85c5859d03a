export const dialogLook = {
  backdrop:
    'fixed inset-0 z-40 bg-[rgb(35_32_27/0.45)] transition-opacity data-starting-style:opacity-0 data-ending-style:opacity-0',
  popup:
    'fixed top-1/2 left-1/2 z-50 max-h-[90dvh] w-[min(34rem,calc(100vw-2rem))] -translate-x-1/2 -translate-y-1/2 overflow-y-auto rounded bg-card p-5 shadow-top transition-opacity outline-none data-starting-style:opacity-0 data-ending-style:opacity-0',
};

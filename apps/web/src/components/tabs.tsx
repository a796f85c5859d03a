import { Tabs as Primitive } from '@base-ui/react/tabs';
import type { ReactNode } from 'react';

export interface Tab {
  id: string;
  word: string;
  content: ReactNode;
}

/** Several views of one thing, where the address need not tell which. */
export function Tabs({ label, tabs }: { label: string; tabs: readonly Tab[] }) {
  return (
    <Primitive.Root defaultValue={tabs[0]?.id}>
      <Primitive.List aria-label={label} className="mb-4 flex gap-1 overflow-x-auto p-1">
        {tabs.map((tab) => (
          <Primitive.Tab
            key={tab.id}
            value={tab.id}
            className="min-h-9 rounded bg-bottom px-3 py-1.5 whitespace-nowrap text-ink-soft hover:text-ink data-active:stitched-act data-active:bg-[length:100%_2px] data-active:bg-no-repeat data-active:font-semibold data-active:text-verdigris"
          >
            {tab.word}
          </Primitive.Tab>
        ))}
      </Primitive.List>
      {tabs.map((tab) => (
        <Primitive.Panel key={tab.id} value={tab.id}>
          {tab.content}
        </Primitive.Panel>
      ))}
    </Primitive.Root>
  );
}

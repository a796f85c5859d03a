interface Page<Item> {
  items: Item[];
  next: string | null;
}

interface Paging {
  limit: number;
  cursor?: string;
}

/** The most that the API gives at once. */
const limit = 200;

/** All of a list, page by page: for fields and sums where nothing may be missing. */
export async function everyPage<Item>(
  read: (paging: Paging) => Promise<Page<Item>>,
): Promise<Page<Item>> {
  const items: Item[] = [];
  for (let cursor: string | null = ''; cursor !== null;) {
    const page: Page<Item> = await read({ limit, ...(cursor && { cursor }) });
    items.push(...page.items);
    cursor = page.next;
  }
  return { items, next: null };
}

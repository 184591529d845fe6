const titles: Readonly<Record<string, string>> = { npn: 'NPN source' };

/** A feedstuff's category as people read it. */
export const categoryTitle = (category: string): string =>
  titles[category] ?? category.charAt(0).toUpperCase() + category.slice(1);

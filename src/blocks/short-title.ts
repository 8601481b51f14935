/** What a build is called in passing: "Curlew" of "Curlew, a 12 ft clinker dinghy". */
export function shortTitle(title: string): string {
  return title.split(',')[0]?.trim() || title;
}

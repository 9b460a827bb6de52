/** One of the pane's views. The part of the address behind "#" says which view is open, and what in it. */
export interface View {
  label: string;
  /** Where its tab leads. */
  home: string;
  opens(address: string): boolean;
  /** What to show; where `from` is given, the reader came from there inside the pane. */
  show(address: string): HTMLElement;
}

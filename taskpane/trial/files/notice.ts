import { h } from "../../pane/h";

/** One line over the tabs for what happened to files and kept work, until it is closed or the next one comes. */
export class Notice {
  private readonly text = h("span", { role: "status" });
  private readonly line: HTMLElement;

  constructor(place: HTMLElement) {
    const close = h("button", { type: "button", click: () => this.say("") }, "Close");
    this.line = h("p", { class: "notice" }, this.text, close);
    this.line.hidden = true;
    place.prepend(this.line);
  }

  says(text: string): boolean {
    return this.text.textContent === text;
  }

  say(text: string, isProblem = false): void {
    this.text.textContent = isProblem ? `Not done: ${text}` : text;
    this.line.classList.toggle("problem", isProblem);
    this.line.hidden = text === "";
  }
}

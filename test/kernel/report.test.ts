import { JSDOM } from "jsdom";
import { describe, expect, test } from "vitest";
import { represent } from "../../kernel/display/represent";
import type { CodeCell, Output, ProseCell } from "../../kernel/notebook/notebookFormat";
import type { NotebookRun } from "../../kernel/notebook/runNotebook";
import { proseHtml } from "../../kernel/report/prose";
import { reportPage } from "../../kernel/report/reportPage";
import { temporaryFolder, written } from "./files";

const folder = temporaryFolder();
const origin = { name: "study.ipynb", folder, date: new Date(2026, 0, 5, 7, 8) };

function prose(source: string): ProseCell {
  return { cell_type: "markdown", id: "p", metadata: {}, source };
}

function code(source: string, outputs: Output[]): CodeCell {
  return { cell_type: "code", id: "c", metadata: {}, source, execution_count: 1, outputs };
}

const figure = {
  kind: "figure",
  name: "f",
  title: "A figure",
  alt: "",
  data: [],
  layout: {},
  cautions: [],
  methods: [],
};
const run: NotebookRun = {
  notebook: {
    metadata: {},
    cells: [
      prose("# How many stages?\n\nFor <b>this</b> feed."),
      code("design", [
        { output_type: "stream", name: "stdout", text: "a < b \u001b[31mred\u001b[0m" },
        {
          output_type: "execute_result",
          execution_count: 1,
          data: represent({ kind: "feed", cautions: [], methods: [] }),
          metadata: {},
        },
      ]),
      code("figure", [
        { output_type: "display_data", data: represent(figure), metadata: {} },
        { output_type: "display_data", data: represent(figure), metadata: {} },
        { output_type: "display_data", data: { "image/png": "AAAA\n" }, metadata: {} },
        { output_type: "display_data", data: { "text/plain": "3" }, metadata: {} },
      ]),
      code("", []),
    ],
  },
  parameters: [{ name: "refluxOverMinimum", value: "1.4" }],
  versions: { refluxbook: "0.1.0", node: "20.19.0" },
};

describe("a report", () => {
  const page = reportPage(run, origin);
  const { document } = new JSDOM(page).window;

  test("heads with title, file, date, parameters and versions", () => {
    expect(document.title).toBe("How many stages?");
    expect([...document.querySelectorAll("h1")].map((each) => each.textContent)).toEqual([
      "How many stages?",
    ]);
    const header = document.querySelector("header")!.textContent;
    expect(header).toContain("study.ipynb");
    expect(header).toContain("2026-01-05 07:08 (UTC");
    expect(header).toContain("refluxOverMinimum1.4");
    expect(header).toContain("refluxbook 0.1.0, node 20.19.0");
  });

  test("folds code and shows outputs as text, table, figure and picture", () => {
    expect([...document.querySelectorAll("details.code pre")].map((each) => each.textContent)).toEqual([
      "design",
      "figure",
    ]);
    expect(document.querySelector("pre.stdout")!.textContent).toBe("a < b red");
    expect(document.querySelectorAll("main .rb-result .rb-title")).toHaveLength(1);
    expect(document.querySelectorAll("main [data-rb-figure]")).toHaveLength(2);
    expect(document.querySelector('img[src="data:image/png;base64,AAAA"]')).not.toBeNull();
  });

  test("holds plotly.js once, styles once, and asks for nothing outside", () => {
    expect(page.match(/DecompressionStream/g)).toHaveLength(1);
    expect(document.querySelectorAll("main style")).toHaveLength(0);
    expect(document.querySelectorAll("[src^=http], link, [href^=http]")).toHaveLength(0);
    expect(document.querySelector("meta[http-equiv]")!.getAttribute("content")).toContain(
      "default-src 'none'",
    );
    expect(page.length).toBeLessThan(6_000_000);
  });

  test("without figures is without plotly.js", () => {
    const plain = { ...run, notebook: { metadata: {}, cells: [prose("text")] } };
    const html = reportPage(plain, origin);
    expect(html.length).toBeLessThan(20_000);
    expect(new JSDOM(html).window.document.querySelector("h1")!.textContent).toBe("study");
  });

  test("of a run that failed begins with the failure", () => {
    const error = { ename: "Error", evalue: "no <feed>", traceback: [] };
    const failure = { why: "cell-failed", number: 3, title: "Feed", firstLine: "x", error } as const;
    const failed = new JSDOM(reportPage({ ...run, failure }, origin)).window.document.querySelector(
      '[role="alert"]',
    )!;
    expect(failed.textContent).toBe("This run did not finish. cell 3, FeedError: no <feed>");
  });
});

describe("prose", () => {
  test("takes no markup and no script link", () => {
    expect(proseHtml(prose("<script>alert(1)</script>"), folder)).toContain("&lt;script&gt;");
    expect(proseHtml(prose("[x](javascript:alert(1))"), folder)).not.toContain("href");
  });

  test("embeds pictures beside the notebook and pasted ones, and keeps the words of others", () => {
    written(folder, "picture.svg", "<svg/>");
    const encoded = Buffer.from("<svg/>").toString("base64");
    expect(proseHtml(prose("![a picture](picture.svg)"), folder)).toContain(
      `<img alt="a picture" src="data:image/svg+xml;base64,${encoded}">`,
    );
    const pasted = { ...prose("![p](attachment:p.png)"), attachments: { "p.png": { "image/png": "AAAA" } } };
    expect(proseHtml(pasted, folder)).toContain('src="data:image/png;base64,AAAA"');
    expect(proseHtml(prose("![far](https://example.org/x.png) ![gone](gone.png)"), folder)).toContain(
      "<em>[picture: far]</em> <em>[picture: gone]</em>",
    );
  });
});

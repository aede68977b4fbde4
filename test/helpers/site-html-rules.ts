import type { ConfigData } from "html-validate";

/** What every page's HTML is held against. */
export const htmlRules: ConfigData = {
  root: true,
  extends: ["html-validate:recommended", "html-validate:standard", "html-validate:a11y"],
  elements: ["html5"],
  rules: {
    "doctype-style": ["error", { style: "lowercase" }],
    // Figure keys are anchors and hold "/"; the rule's own pattern is for hand-written ids.
    "valid-id": ["error", { relaxed: true }],
    "id-pattern": ["error", { pattern: "^[a-z0-9][a-zA-Z0-9./-]*$" }],
    // The style sheet keeps `.tel` on one line.
    "tel-non-breaking": ["error", { ignoreClasses: ["tel"] }],
    "no-inline-style": "error",
    "require-csp-nonce": "off",
  },
};

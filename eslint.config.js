import tseslint from "typescript-eslint";

/** Which rooms a room may import from, besides itself (see DEVELOPERS.md, "The house"). */
const MAY_IMPORT = {
  chemistry: [],
  blending: ["chemistry"],
  oils: ["chemistry"],
  cells: ["chemistry", "blending", "oils"],
  functions: ["chemistry", "blending", "oils", "cells"],
  pane: ["chemistry", "blending", "oils", "cells", "functions"],
  hosts: ["chemistry", "blending", "oils", "cells", "functions", "pane"],
  build: ["chemistry", "blending", "oils", "cells", "functions", "pane", "hosts"],
};
const ROOMS = Object.keys(MAY_IMPORT);
const PURE = ["chemistry", "blending", "oils", "cells", "functions"];

const roomRules = ROOMS.map((room) => {
  const closed = ROOMS.filter((other) => other !== room && !MAY_IMPORT[room].includes(other));
  const patterns = closed.map((other) => ({
    regex: `^(\\.\\./)+${other}/`,
    message: `${room} may not know ${other}: arrows between rooms point one way.`,
  }));
  if (PURE.includes(room)) patterns.push({ regex: "^[^.]", message: `${room} is pure: no package is imported here.` });
  return { files: [`src/${room}/**/*.ts`], rules: { "no-restricted-imports": ["error", { patterns }] } };
});

export default tseslint.config(
  { ignores: ["dist/", "coverage/", "node_modules/"] },
  ...tseslint.configs.strictTypeChecked,
  {
    languageOptions: {
      parserOptions: {
        projectService: { allowDefaultProject: ["*.js", "*.ts", "src/build/*.mjs"] },
        tsconfigRootDir: import.meta.dirname,
      },
    },
    rules: {
      "@typescript-eslint/no-explicit-any": "error",
      "@typescript-eslint/restrict-template-expressions": ["error", { allowNumber: true }],
      "@typescript-eslint/prefer-literal-enum-member": "off",
      "max-lines": ["error", { max: 250, skipBlankLines: true, skipComments: true }],
      complexity: ["error", 15],
    },
  },
  ...roomRules,
  { files: ["**/*.js", "**/*.mjs"], ...tseslint.configs.disableTypeChecked },
  {
    files: ["tests/**/*.ts"],
    rules: { "max-lines": "off", "@typescript-eslint/no-non-null-assertion": "off" },
  },
);

import tailwindcss from "@tailwindcss/vite";
import react from "@vitejs/plugin-react";
import { defineConfig } from "vite";

const api = process.env.API_URL ?? "http://127.0.0.1:3000";

export default defineConfig({
  plugins: [react(), tailwindcss()],
  server: {
    host: "127.0.0.1",
    port: Number(process.env.WEB_PORT ?? 5173),
    strictPort: process.env.WEB_PORT !== undefined,
    // The API takes changes from its own pages only; here the page comes from Vite, which vouches for it.
    proxy: { "/api": { target: api, changeOrigin: true, headers: { origin: new URL(api).origin } } },
  },
  worker: { format: "es" },
  build: {
    target: "es2023",
    sourcemap: false,
    manifest: true,
    chunkSizeWarningLimit: 1300,
    rolldownOptions: {
      output: {
        codeSplitting: {
          groups: [
            // Every page needs these; the sign-in and the client's page need nothing else from outside.
            { name: "react", test: /node_modules[\\/](react|react-dom|scheduler)[\\/]/, priority: 3 },
            { name: "router", test: /node_modules[\\/](react-router|react-router-dom)[\\/]/, priority: 2 },
            { name: "forms", test: /node_modules[\\/](react-hook-form|@hookform)[\\/]/, priority: 2 },
            { name: "table", test: /node_modules[\\/]@tanstack[\\/](react-table|table-core)/, priority: 2 },
          ],
        },
      },
    },
  },
});

/**
 * Three builds:
 *   addin     what Excel loads: functions and pane in one bundle, one runtime   → dist/addin, for scripts/package.ts
 *   workbook  the local workbook page: grid, pane, functions                    → dist/workbook
 *   commands  recalc, start and the rest, for Node                              → dist/commands
 * `webpack --config-name workbook` builds one of them.
 */
const path = require('node:path');
const CopyWebpackPlugin = require('copy-webpack-plugin');
const HtmlWebpackPlugin = require('html-webpack-plugin');
const MiniCssExtractPlugin = require('mini-css-extract-plugin');
const { EsbuildPlugin } = require('esbuild-loader');

const base = (name) => ({
  name,
  mode: 'production',
  context: __dirname,
  resolve: { extensions: ['.ts', '.js'] },
  module: {
    rules: [
      { test: /\.ts$/, loader: 'esbuild-loader', options: { target: 'es2022' } },
      { test: /\.css$/, use: [MiniCssExtractPlugin.loader, 'css-loader'] },
    ],
  },
  optimization: { minimizer: [new EsbuildPlugin({ target: 'es2022', css: true })] },
  output: { path: path.join(__dirname, 'dist', name), filename: '[name].js', clean: true },
  performance: { hints: false },
  cache: { type: 'filesystem', cacheDirectory: path.join(__dirname, '.cache', name) },
});

const addin = {
  ...base('addin'),
  entry: { addin: './workbook/addin/main.ts' },
  // a name that changes with its content can be kept by a browser for ever
  output: { ...base('addin').output, filename: 'built/[name].[contenthash:12].js' },
  plugins: [
    new MiniCssExtractPlugin({ filename: 'built/[name].[contenthash:12].css' }),
    new HtmlWebpackPlugin({
      filename: 'taskpane.html',
      template: './workbook/addin/taskpane.html',
      scriptLoading: 'defer',
    }),
    new CopyWebpackPlugin({ patterns: [{ from: 'assets', to: 'assets' }] }),
  ],
};

const workbook = {
  ...base('workbook'),
  entry: { workbook: './workbook/page/main.ts' },
  // several files are compiled side by side while they arrive
  optimization: { ...base('workbook').optimization, splitChunks: { chunks: 'all', maxSize: 1_000_000 } },
  plugins: [
    new MiniCssExtractPlugin(),
    new HtmlWebpackPlugin({
      filename: 'index.html',
      template: './workbook/page/index.html',
      scriptLoading: 'defer',
    }),
    new CopyWebpackPlugin({ patterns: [{ from: 'assets', to: 'assets' }] }),
  ],
};

const commands = {
  ...base('commands'),
  target: 'node20',
  // finds files of its own beside itself
  externals: { 'office-addin-manifest': 'commonjs office-addin-manifest' },
  entry: {
    recalc: './workbook/commands/recalc.ts',
    handover: './workbook/commands/handover.ts',
    start: './workbook/commands/start.ts',
    derive: './scripts/derive.ts',
    bench: './tests/bench/bench.ts',
    simulate: './tests/simulations/simulate.ts',
    package: './scripts/package.ts',
    excel: './scripts/excel.ts',
  },
  output: { ...base('commands').output, filename: '[name].cjs' },
  optimization: { minimize: false },
};

module.exports = [addin, workbook, commands];

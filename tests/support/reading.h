#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/source_text.h"
#include "gainsay/cli/toml_tree.h"

#include <gtest/gtest.h>

#include <memory>
#include <sstream>
#include <string>
#include <utility>

namespace gainsay::testing {

inline std::shared_ptr<const cli::SourceText> source(std::string bytes,
                                                     std::string name = "file.toml") {
  return std::make_shared<const cli::SourceText>(
      cli::SourceText{std::move(name), std::move(bytes)});
}

/// What was collected, as it is printed.
inline std::string said(const cli::Diagnostics& diagnostics) {
  std::ostringstream out;
  cli::print(out, diagnostics.collected(), false);
  return out.str();
}

/// The same without what was expected and what to do: one line a message.
inline std::string said_briefly(const cli::Diagnostics& diagnostics) {
  std::string text;
  for (const cli::Diagnostic& one : diagnostics.collected()) {
    text += std::to_string(one.line) + ":" + std::to_string(one.column) + ": " + one.what + "\n";
  }
  return text;
}

/// A document without errors; a failed test and an empty table where it has some.
inline cli::TomlValue toml(std::string text) {
  cli::Diagnostics diagnostics;
  auto document = cli::read_toml(source(std::move(text)), diagnostics);
  EXPECT_TRUE(document.has_value()) << said(diagnostics);
  return document.value_or(cli::TomlValue{});
}

}  // namespace gainsay::testing

#pragma once

#include "gainsay/cli/console.h"
#include "gainsay/core/result.h"

#include <cstddef>
#include <ostream>
#include <string>
#include <vector>

namespace gainsay::cli {

enum class Severity { Error, Warning };

/// One message with its place: what is wrong (lower case, names in quotes), what was expected, what
/// to do.
struct Diagnostic {
  Severity severity = Severity::Error;
  std::string file;        ///< relative to the study, with '/'
  std::size_t line = 0;    ///< from 1; 0 where the whole file is meant
  std::size_t column = 0;  ///< in characters, from 1
  std::string what;
  std::string expected;
  std::string to_do;
  bool operator==(const Diagnostic&) const = default;
};

bool has_errors(const std::vector<Diagnostic>& diagnostics);

/// Sorts by file, line, column; drops doubles.
void put_in_order(std::vector<Diagnostic>& diagnostics);

/// `file:line:column: error: what`, then `    expected ...`, then `    to do: ...`.
void print(std::ostream& out, const std::vector<Diagnostic>& diagnostics, bool colour);

/// A failure that has no place in a file: `error: what`, expected, to do.
void print_failure(const Console& console, const core::Failure& failure);

}  // namespace gainsay::cli

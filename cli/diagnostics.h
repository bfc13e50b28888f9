#pragma once

#include "gainsay/cli/console.h"
#include "gainsay/cli/source_text.h"
#include "gainsay/core/result.h"

#include <cstddef>
#include <map>
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

/// `file:line:column: error: what`, then `    expected ...`, then `    to do: ...`. Characters that
/// would steer a terminal are shown as `?`.
void print(std::ostream& out, const std::vector<Diagnostic>& diagnostics, bool colour);

/// A failure that has no place in a file: `error: what`, expected, to do.
void print_failure(const Console& console, const core::Failure& failure);

/// The words of a message, without its place.
struct Message {
  std::string what;
  std::string expected;
  std::string to_do;
};

/// Collects what the readers of a study find. A file that is wrong all over gives its first
/// `kMostOfOneFile` errors and a count of the others.
class Diagnostics {
 public:
  static constexpr std::size_t kMostOfOneFile = 100;

  void error(const Location& at, Message message);
  void warning(const Location& at, Message message);
  bool has_errors() const { return errors_ > 0; }
  std::size_t errors() const { return errors_; }

  /// All of them, in order.
  std::vector<Diagnostic> collected() const;

 private:
  std::vector<Diagnostic> diagnostics_;
  std::map<std::string, std::size_t> errors_of_file_;
  std::size_t errors_ = 0;
};

}  // namespace gainsay::cli

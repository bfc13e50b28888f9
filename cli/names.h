#pragma once

#include "gainsay/cli/diagnostics.h"
#include "gainsay/cli/written_expression.h"

#include <map>
#include <string>
#include <string_view>
#include <vector>

namespace gainsay::cli {

/// What a name of the one name space of expressions stands for.
enum class NameKind { Species, Compartment, Reaction, Definition, Known, Unknown, Input };

struct DeclaredName {
  std::string name;
  NameKind kind = NameKind::Known;
  Location place;
};

/// "species", "name under [where]", ...
std::string_view word_for(NameKind kind);

/// The same with its article.
std::string with_a(NameKind kind);

/// The names that expressions of one hypothesis may use.
class NameSpace {
 public:
  /// Declares a name; where it is taken, says so at the later place and keeps the first.
  void declare(const DeclaredName& declared, Diagnostics& diagnostics);
  bool holds(std::string_view name) const { return names_.find(name) != names_.end(); }
  const DeclaredName* find(std::string_view name) const;
  std::vector<std::string> all() const;

 private:
  std::map<std::string, DeclaredName, std::less<>> names_;
};

/// Says which names of an expression are unknown, with the nearest known one. `where_else` ends the
/// sentence: "" or " for hypothesis 'two'".
void check_names(const WrittenExpression& written, const NameSpace& known,
                 const std::string& where_else, Diagnostics& diagnostics);

}  // namespace gainsay::cli

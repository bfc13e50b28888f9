#include "gainsay/cli/names.h"

#include "gainsay/core/nearest_name.h"

#include <algorithm>

namespace gainsay::cli {

std::string_view words_for(NameKind kind) {
  switch (kind) {
    case NameKind::Species:
      return "a species";
    case NameKind::Compartment:
      return "a compartment";
    case NameKind::Reaction:
      return "a reaction";
    case NameKind::Definition:
      return "a name under [where]";
    case NameKind::Known:
      return "a known";
    case NameKind::Unknown:
      return "an unknown";
    case NameKind::Input:
      break;
  }
  return "an input";
}

void NameSpace::declare(const DeclaredName& declared, Diagnostics& diagnostics) {
  const auto [taken, is_new] = names_.try_emplace(declared.name, declared);
  if (is_new) return;
  const DeclaredName& first = taken->second;
  const std::string first_place = first.place.file() + ":" + std::to_string(first.place.line);
  diagnostics.error(
      declared.place,
      {"the name '" + declared.name + "' is " + std::string(words_for(declared.kind)) +
           " here and " + std::string(words_for(first.kind)) + " in " + first_place,
       "one meaning for each name of species, compartments, reactions, [where], "
       "knowns, unknowns and inputs",
       "rename one of the two"});
}

const DeclaredName* NameSpace::find(std::string_view name) const {
  const auto found = names_.find(name);
  return found == names_.end() ? nullptr : &found->second;
}

std::vector<std::string> NameSpace::all() const {
  std::vector<std::string> names;
  for (const auto& [name, declared] : names_) names.push_back(name);
  return names;
}

void check_names(const WrittenExpression& written, const NameSpace& known,
                 const std::string& where_else, Diagnostics& diagnostics) {
  for (const NameInText& used : written.names) {
    if (known.holds(used.name)) continue;
    const std::vector<std::string> candidates = known.all();
    const auto nearest = core::nearest_name(used.name, candidates);
    std::string expected =
        "a species, a reaction, an input, a known, an unknown, a name under "
        "[where] or a function";
    if (nearest) expected += "; nearest known name: '" + *nearest + "'";
    diagnostics.error(
        used.place,
        {"unknown name '" + used.name + "' in " + written.role + where_else, expected,
         "correct the name, or add '" + used.name + "' under [species], [where] or [unknowns]"});
  }
}

}  // namespace gainsay::cli

#pragma once

#include "gainsay/cli/study_keys.h"

#include <string>
#include <string_view>

namespace gainsay::cli {

/// The keys of a section as a Markdown table: key, what it takes, unit, default, example, meaning;
/// keys that are not yet accepted come last, marked so.
std::string keys_as_markdown(Section section);

/// `page` with the text between each `<!-- keys: FILE: HEADER -->` (as in SectionWords) and
/// `<!-- end of keys -->` replaced by the table of that section. docs/study-files.md equals what
/// this makes of it.
std::string with_key_tables(std::string_view page);

}  // namespace gainsay::cli

"""Generated from record.schema.json by fastjsonschema and tools/record_validator.py. Do not edit."""


class JsonSchemaValueException(ValueError):
    """What a document breaks; here so that fastjsonschema itself need not travel to a phone."""

    def __init__(self, message):
        super().__init__(message)
        self.message = message


VERSION = "2.22.3"
from decimal import Decimal
import re


REGEX_PATTERNS = {
    '^[A-Za-z0-9_.:-]+$': re.compile('^[A-Za-z0-9_.:-]+\\Z'),
    '^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$': re.compile('^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?\\Z'),
    '^[0-9a-f]{64}$': re.compile('^[0-9a-f]{64}\\Z')
}

NoneType = type(None)

def validate(data, custom_formats={}, name_prefix=None):
    if not isinstance(data, (dict)):
        raise JsonSchemaValueException("" + (name_prefix or "data") + " must be object")
    data_is_dict = isinstance(data, dict)
    if data_is_dict:
        data__missing_keys = set(['format', 'version', 'id', 'created', 'changed', 'found_at', 'valid_until', 'found_by', 'place', 'ends', 'settings', 'spans', 'overhangs', 'supports', 'hinges', 'section', 'self_weight', 'permanent', 'restraint', 'loads', 'limits', 'condition', 'photos', 'decision', 'notes']) - data.keys()
        if data__missing_keys:
            raise JsonSchemaValueException("" + (name_prefix or "data") + " must contain ")
        data_keys = set(data.keys())
        if "format" in data_keys:
            data_keys.remove("format")
            data__format = data["format"]
            if not (isinstance(data__format, str) and data__format == 'asfound-record'):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".format must be one of ['asfound-record']")
        if "version" in data_keys:
            data_keys.remove("version")
            data__version = data["version"]
            if not (isinstance(data__version, (int, float)) and not isinstance(data__version, bool) and data__version == 1):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".version must be one of [1]")
        if "id" in data_keys:
            data_keys.remove("id")
            data__id = data["id"]
            if not isinstance(data__id, (str)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".id must be string")
            if isinstance(data__id, str):
                data__id_len = len(data__id)
                if data__id_len < 1:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".id must be longer than or equal to 1 characters")
                if data__id_len > 64:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".id must be shorter than or equal to 64 characters")
                if not REGEX_PATTERNS['^[A-Za-z0-9_.:-]+$'].search(data__id):
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".id must match pattern ^[A-Za-z0-9_.:-]+$")
        if "created" in data_keys:
            data_keys.remove("created")
            data__created = data["created"]
            if not isinstance(data__created, (str, NoneType)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".created must be string or null")
            if isinstance(data__created, str):
                data__created_len = len(data__created)
                if data__created_len > 40:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".created must be shorter than or equal to 40 characters")
                if not REGEX_PATTERNS['^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$'].search(data__created):
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".created must match pattern ^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$")
        if "changed" in data_keys:
            data_keys.remove("changed")
            data__changed = data["changed"]
            if not isinstance(data__changed, (str, NoneType)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".changed must be string or null")
            if isinstance(data__changed, str):
                data__changed_len = len(data__changed)
                if data__changed_len > 40:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".changed must be shorter than or equal to 40 characters")
                if not REGEX_PATTERNS['^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$'].search(data__changed):
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".changed must match pattern ^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$")
        if "found_at" in data_keys:
            data_keys.remove("found_at")
            data__foundat = data["found_at"]
            if not isinstance(data__foundat, (str, NoneType)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".found_at must be string or null")
            if isinstance(data__foundat, str):
                data__foundat_len = len(data__foundat)
                if data__foundat_len > 40:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".found_at must be shorter than or equal to 40 characters")
                if not REGEX_PATTERNS['^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$'].search(data__foundat):
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".found_at must match pattern ^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$")
        if "valid_until" in data_keys:
            data_keys.remove("valid_until")
            data__validuntil = data["valid_until"]
            if not isinstance(data__validuntil, (str, NoneType)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".valid_until must be string or null")
            if isinstance(data__validuntil, str):
                data__validuntil_len = len(data__validuntil)
                if data__validuntil_len > 40:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".valid_until must be shorter than or equal to 40 characters")
                if not REGEX_PATTERNS['^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$'].search(data__validuntil):
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".valid_until must match pattern ^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$")
        if "found_by" in data_keys:
            data_keys.remove("found_by")
            data__foundby = data["found_by"]
            if not isinstance(data__foundby, (dict)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".found_by must be object")
            data__foundby_is_dict = isinstance(data__foundby, dict)
            if data__foundby_is_dict:
                data__foundby__missing_keys = set(['name', 'role', 'phone']) - data__foundby.keys()
                if data__foundby__missing_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".found_by must contain ")
                data__foundby_keys = set(data__foundby.keys())
                if "name" in data__foundby_keys:
                    data__foundby_keys.remove("name")
                    data__foundby__name = data__foundby["name"]
                    if not isinstance(data__foundby__name, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".found_by.name must be string")
                    if isinstance(data__foundby__name, str):
                        data__foundby__name_len = len(data__foundby__name)
                        if data__foundby__name_len > 120:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".found_by.name must be shorter than or equal to 120 characters")
                if "role" in data__foundby_keys:
                    data__foundby_keys.remove("role")
                    data__foundby__role = data__foundby["role"]
                    if not isinstance(data__foundby__role, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".found_by.role must be string")
                    if isinstance(data__foundby__role, str):
                        data__foundby__role_len = len(data__foundby__role)
                        if data__foundby__role_len > 120:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".found_by.role must be shorter than or equal to 120 characters")
                if "phone" in data__foundby_keys:
                    data__foundby_keys.remove("phone")
                    data__foundby__phone = data__foundby["phone"]
                    if not isinstance(data__foundby__phone, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".found_by.phone must be string")
                    if isinstance(data__foundby__phone, str):
                        data__foundby__phone_len = len(data__foundby__phone)
                        if data__foundby__phone_len > 40:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".found_by.phone must be shorter than or equal to 40 characters")
                if data__foundby_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".found_by must not contain "+str(data__foundby_keys)+" properties")
        if "place" in data_keys:
            data_keys.remove("place")
            data__place = data["place"]
            if not isinstance(data__place, (dict)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".place must be object")
            data__place_is_dict = isinstance(data__place, dict)
            if data__place_is_dict:
                data__place__missing_keys = set(['site', 'member', 'drawing', 'revision', 'stage']) - data__place.keys()
                if data__place__missing_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".place must contain ")
                data__place_keys = set(data__place.keys())
                if "site" in data__place_keys:
                    data__place_keys.remove("site")
                    data__place__site = data__place["site"]
                    if not isinstance(data__place__site, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".place.site must be string")
                    if isinstance(data__place__site, str):
                        data__place__site_len = len(data__place__site)
                        if data__place__site_len > 200:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".place.site must be shorter than or equal to 200 characters")
                if "member" in data__place_keys:
                    data__place_keys.remove("member")
                    data__place__member = data__place["member"]
                    if not isinstance(data__place__member, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".place.member must be string")
                    if isinstance(data__place__member, str):
                        data__place__member_len = len(data__place__member)
                        if data__place__member_len > 120:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".place.member must be shorter than or equal to 120 characters")
                if "drawing" in data__place_keys:
                    data__place_keys.remove("drawing")
                    data__place__drawing = data__place["drawing"]
                    if not isinstance(data__place__drawing, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".place.drawing must be string")
                    if isinstance(data__place__drawing, str):
                        data__place__drawing_len = len(data__place__drawing)
                        if data__place__drawing_len > 120:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".place.drawing must be shorter than or equal to 120 characters")
                if "revision" in data__place_keys:
                    data__place_keys.remove("revision")
                    data__place__revision = data__place["revision"]
                    if not isinstance(data__place__revision, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".place.revision must be string")
                    if isinstance(data__place__revision, str):
                        data__place__revision_len = len(data__place__revision)
                        if data__place__revision_len > 40:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".place.revision must be shorter than or equal to 40 characters")
                if "stage" in data__place_keys:
                    data__place_keys.remove("stage")
                    data__place__stage = data__place["stage"]
                    if not isinstance(data__place__stage, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".place.stage must be string")
                    if isinstance(data__place__stage, str):
                        data__place__stage_len = len(data__place__stage)
                        if data__place__stage_len > 120:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".place.stage must be shorter than or equal to 120 characters")
                if data__place_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".place must not contain "+str(data__place_keys)+" properties")
        if "ends" in data_keys:
            data_keys.remove("ends")
            data__ends = data["ends"]
            if not isinstance(data__ends, (dict)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".ends must be object")
            data__ends_is_dict = isinstance(data__ends, dict)
            if data__ends_is_dict:
                data__ends__missing_keys = set(['left', 'right']) - data__ends.keys()
                if data__ends__missing_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".ends must contain ")
                data__ends_keys = set(data__ends.keys())
                if "left" in data__ends_keys:
                    data__ends_keys.remove("left")
                    data__ends__left = data__ends["left"]
                    if not isinstance(data__ends__left, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".ends.left must be string")
                    if isinstance(data__ends__left, str):
                        data__ends__left_len = len(data__ends__left)
                        if data__ends__left_len > 120:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".ends.left must be shorter than or equal to 120 characters")
                if "right" in data__ends_keys:
                    data__ends_keys.remove("right")
                    data__ends__right = data__ends["right"]
                    if not isinstance(data__ends__right, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".ends.right must be string")
                    if isinstance(data__ends__right, str):
                        data__ends__right_len = len(data__ends__right)
                        if data__ends__right_len > 120:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".ends.right must be shorter than or equal to 120 characters")
                if data__ends_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".ends must not contain "+str(data__ends_keys)+" properties")
        if "settings" in data_keys:
            data_keys.remove("settings")
            data__settings = data["settings"]
            if not isinstance(data__settings, (dict)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".settings must be object")
            data__settings_is_dict = isinstance(data__settings, dict)
            if data__settings_is_dict:
                data__settings__missing_keys = set(['display', 'phone']) - data__settings.keys()
                if data__settings__missing_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".settings must contain ")
                data__settings_keys = set(data__settings.keys())
                if "display" in data__settings_keys:
                    data__settings_keys.remove("display")
                    data__settings__display = data__settings["display"]
                    if not (isinstance(data__settings__display, str) and data__settings__display == 'metric' or isinstance(data__settings__display, str) and data__settings__display == 'us'):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".settings.display must be one of ['metric', 'us']")
                if "phone" in data__settings_keys:
                    data__settings_keys.remove("phone")
                    data__settings__phone = data__settings["phone"]
                    if not isinstance(data__settings__phone, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".settings.phone must be string")
                    if isinstance(data__settings__phone, str):
                        data__settings__phone_len = len(data__settings__phone)
                        if data__settings__phone_len > 40:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".settings.phone must be shorter than or equal to 40 characters")
                if data__settings_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".settings must not contain "+str(data__settings_keys)+" properties")
        if "spans" in data_keys:
            data_keys.remove("spans")
            data__spans = data["spans"]
            if not isinstance(data__spans, (list, tuple)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".spans must be array")
            data__spans_is_list = isinstance(data__spans, (list, tuple))
            if data__spans_is_list:
                data__spans_len = len(data__spans)
                if data__spans_len < 1:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".spans must contain at least 1 items")
                if data__spans_len > 12:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".spans must contain less than or equal to 12 items")
                for data__spans_x, data__spans_item in enumerate(data__spans):
                    if not isinstance(data__spans_item, (dict)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".spans[{data__spans_x}]".format(**locals()) + " must be object")
                    data__spans_item_is_dict = isinstance(data__spans_item, dict)
                    if data__spans_item_is_dict:
                        data__spans_item__missing_keys = set(['measure', 'length', 'drawn']) - data__spans_item.keys()
                        if data__spans_item__missing_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".spans[{data__spans_x}]".format(**locals()) + " must contain ")
                        data__spans_item_keys = set(data__spans_item.keys())
                        if "measure" in data__spans_item_keys:
                            data__spans_item_keys.remove("measure")
                            data__spans_item__measure = data__spans_item["measure"]
                            if not (isinstance(data__spans_item__measure, str) and data__spans_item__measure == 'centres' or isinstance(data__spans_item__measure, str) and data__spans_item__measure == 'clear' or data__spans_item__measure is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".spans[{data__spans_x}].measure".format(**locals()) + " must be one of ['centres', 'clear', None]")
                        if "length" in data__spans_item_keys:
                            data__spans_item_keys.remove("length")
                            data__spans_item__length = data__spans_item["length"]
                            validate___definitions_quantity(data__spans_item__length, custom_formats, (name_prefix or "data") + ".spans[{data__spans_x}].length".format(**locals()))
                        if "drawn" in data__spans_item_keys:
                            data__spans_item_keys.remove("drawn")
                            data__spans_item__drawn = data__spans_item["drawn"]
                            validate___definitions_quantity(data__spans_item__drawn, custom_formats, (name_prefix or "data") + ".spans[{data__spans_x}].drawn".format(**locals()))
                        if data__spans_item_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".spans[{data__spans_x}]".format(**locals()) + " must not contain "+str(data__spans_item_keys)+" properties")
        if "overhangs" in data_keys:
            data_keys.remove("overhangs")
            data__overhangs = data["overhangs"]
            if not isinstance(data__overhangs, (dict)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".overhangs must be object")
            data__overhangs_is_dict = isinstance(data__overhangs, dict)
            if data__overhangs_is_dict:
                data__overhangs__missing_keys = set(['left', 'right']) - data__overhangs.keys()
                if data__overhangs__missing_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".overhangs must contain ")
                data__overhangs_keys = set(data__overhangs.keys())
                if "left" in data__overhangs_keys:
                    data__overhangs_keys.remove("left")
                    data__overhangs__left = data__overhangs["left"]
                    validate___definitions_quantity(data__overhangs__left, custom_formats, (name_prefix or "data") + ".overhangs.left")
                if "right" in data__overhangs_keys:
                    data__overhangs_keys.remove("right")
                    data__overhangs__right = data__overhangs["right"]
                    validate___definitions_quantity(data__overhangs__right, custom_formats, (name_prefix or "data") + ".overhangs.right")
                if data__overhangs_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".overhangs must not contain "+str(data__overhangs_keys)+" properties")
        if "supports" in data_keys:
            data_keys.remove("supports")
            data__supports = data["supports"]
            if not isinstance(data__supports, (list, tuple)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".supports must be array")
            data__supports_is_list = isinstance(data__supports, (list, tuple))
            if data__supports_is_list:
                data__supports_len = len(data__supports)
                if data__supports_len < 2:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".supports must contain at least 2 items")
                if data__supports_len > 13:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".supports must contain less than or equal to 13 items")
                for data__supports_x, data__supports_item in enumerate(data__supports):
                    if not isinstance(data__supports_item, (dict)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".supports[{data__supports_x}]".format(**locals()) + " must be object")
                    data__supports_item_is_dict = isinstance(data__supports_item, dict)
                    if data__supports_item_is_dict:
                        data__supports_item__missing_keys = set(['name', 'kind', 'bearing', 'bearing_drawn', 'stiffness', 'rotational', 'settlement', 'note']) - data__supports_item.keys()
                        if data__supports_item__missing_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".supports[{data__supports_x}]".format(**locals()) + " must contain ")
                        data__supports_item_keys = set(data__supports_item.keys())
                        if "name" in data__supports_item_keys:
                            data__supports_item_keys.remove("name")
                            data__supports_item__name = data__supports_item["name"]
                            if not isinstance(data__supports_item__name, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".supports[{data__supports_x}].name".format(**locals()) + " must be string")
                            if isinstance(data__supports_item__name, str):
                                data__supports_item__name_len = len(data__supports_item__name)
                                if data__supports_item__name_len > 40:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".supports[{data__supports_x}].name".format(**locals()) + " must be shorter than or equal to 40 characters")
                        if "kind" in data__supports_item_keys:
                            data__supports_item_keys.remove("kind")
                            data__supports_item__kind = data__supports_item["kind"]
                            if not (isinstance(data__supports_item__kind, str) and data__supports_item__kind == 'bearing' or isinstance(data__supports_item__kind, str) and data__supports_item__kind == 'pinned' or isinstance(data__supports_item__kind, str) and data__supports_item__kind == 'fixed' or isinstance(data__supports_item__kind, str) and data__supports_item__kind == 'spring' or isinstance(data__supports_item__kind, str) and data__supports_item__kind == 'free' or data__supports_item__kind is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".supports[{data__supports_x}].kind".format(**locals()) + " must be one of ['bearing', 'pinned', 'fixed', 'spring', 'free', None]")
                        if "bearing" in data__supports_item_keys:
                            data__supports_item_keys.remove("bearing")
                            data__supports_item__bearing = data__supports_item["bearing"]
                            validate___definitions_quantity(data__supports_item__bearing, custom_formats, (name_prefix or "data") + ".supports[{data__supports_x}].bearing".format(**locals()))
                        if "bearing_drawn" in data__supports_item_keys:
                            data__supports_item_keys.remove("bearing_drawn")
                            data__supports_item__bearingdrawn = data__supports_item["bearing_drawn"]
                            validate___definitions_quantity(data__supports_item__bearingdrawn, custom_formats, (name_prefix or "data") + ".supports[{data__supports_x}].bearing_drawn".format(**locals()))
                        if "stiffness" in data__supports_item_keys:
                            data__supports_item_keys.remove("stiffness")
                            data__supports_item__stiffness = data__supports_item["stiffness"]
                            validate___definitions_quantity(data__supports_item__stiffness, custom_formats, (name_prefix or "data") + ".supports[{data__supports_x}].stiffness".format(**locals()))
                        if "rotational" in data__supports_item_keys:
                            data__supports_item_keys.remove("rotational")
                            data__supports_item__rotational = data__supports_item["rotational"]
                            validate___definitions_quantity(data__supports_item__rotational, custom_formats, (name_prefix or "data") + ".supports[{data__supports_x}].rotational".format(**locals()))
                        if "settlement" in data__supports_item_keys:
                            data__supports_item_keys.remove("settlement")
                            data__supports_item__settlement = data__supports_item["settlement"]
                            validate___definitions_quantity(data__supports_item__settlement, custom_formats, (name_prefix or "data") + ".supports[{data__supports_x}].settlement".format(**locals()))
                        if "note" in data__supports_item_keys:
                            data__supports_item_keys.remove("note")
                            data__supports_item__note = data__supports_item["note"]
                            if not isinstance(data__supports_item__note, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".supports[{data__supports_x}].note".format(**locals()) + " must be string")
                            if isinstance(data__supports_item__note, str):
                                data__supports_item__note_len = len(data__supports_item__note)
                                if data__supports_item__note_len > 500:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".supports[{data__supports_x}].note".format(**locals()) + " must be shorter than or equal to 500 characters")
                        if data__supports_item_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".supports[{data__supports_x}]".format(**locals()) + " must not contain "+str(data__supports_item_keys)+" properties")
        if "hinges" in data_keys:
            data_keys.remove("hinges")
            data__hinges = data["hinges"]
            if not isinstance(data__hinges, (list, tuple)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".hinges must be array")
            data__hinges_is_list = isinstance(data__hinges, (list, tuple))
            if data__hinges_is_list:
                data__hinges_len = len(data__hinges)
                if data__hinges_len > 12:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".hinges must contain less than or equal to 12 items")
                for data__hinges_x, data__hinges_item in enumerate(data__hinges):
                    if not isinstance(data__hinges_item, (dict)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".hinges[{data__hinges_x}]".format(**locals()) + " must be object")
                    data__hinges_item_is_dict = isinstance(data__hinges_item, dict)
                    if data__hinges_item_is_dict:
                        data__hinges_item__missing_keys = set(['position']) - data__hinges_item.keys()
                        if data__hinges_item__missing_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".hinges[{data__hinges_x}]".format(**locals()) + " must contain ")
                        data__hinges_item_keys = set(data__hinges_item.keys())
                        if "position" in data__hinges_item_keys:
                            data__hinges_item_keys.remove("position")
                            data__hinges_item__position = data__hinges_item["position"]
                            validate___definitions_position(data__hinges_item__position, custom_formats, (name_prefix or "data") + ".hinges[{data__hinges_x}].position".format(**locals()))
                        if data__hinges_item_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".hinges[{data__hinges_x}]".format(**locals()) + " must not contain "+str(data__hinges_item_keys)+" properties")
        if "section" in data_keys:
            data_keys.remove("section")
            data__section = data["section"]
            if not isinstance(data__section, (dict)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".section must be object")
            data__section_is_dict = isinstance(data__section, dict)
            if data__section_is_dict:
                data__section__missing_keys = set(['identity', 'depth', 'stiffness', 'zones', 'note']) - data__section.keys()
                if data__section__missing_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".section must contain ")
                data__section_keys = set(data__section.keys())
                if "identity" in data__section_keys:
                    data__section_keys.remove("identity")
                    data__section__identity = data__section["identity"]
                    if not (isinstance(data__section__identity, str) and data__section__identity == 'same' or isinstance(data__section__identity, str) and data__section__identity == 'different' or isinstance(data__section__identity, str) and data__section__identity == 'not_seen' or data__section__identity is None):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".section.identity must be one of ['same', 'different', 'not_seen', None]")
                if "depth" in data__section_keys:
                    data__section_keys.remove("depth")
                    data__section__depth = data__section["depth"]
                    validate___definitions_quantity(data__section__depth, custom_formats, (name_prefix or "data") + ".section.depth")
                if "stiffness" in data__section_keys:
                    data__section_keys.remove("stiffness")
                    data__section__stiffness = data__section["stiffness"]
                    validate___definitions_quantity(data__section__stiffness, custom_formats, (name_prefix or "data") + ".section.stiffness")
                if "zones" in data__section_keys:
                    data__section_keys.remove("zones")
                    data__section__zones = data__section["zones"]
                    if not isinstance(data__section__zones, (list, tuple)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".section.zones must be array")
                    data__section__zones_is_list = isinstance(data__section__zones, (list, tuple))
                    if data__section__zones_is_list:
                        data__section__zones_len = len(data__section__zones)
                        if data__section__zones_len > 24:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".section.zones must contain less than or equal to 24 items")
                        for data__section__zones_x, data__section__zones_item in enumerate(data__section__zones):
                            if not isinstance(data__section__zones_item, (dict)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".section.zones[{data__section__zones_x}]".format(**locals()) + " must be object")
                            data__section__zones_item_is_dict = isinstance(data__section__zones_item, dict)
                            if data__section__zones_item_is_dict:
                                data__section__zones_item__missing_keys = set(['position', 'length', 'stiffness']) - data__section__zones_item.keys()
                                if data__section__zones_item__missing_keys:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".section.zones[{data__section__zones_x}]".format(**locals()) + " must contain ")
                                data__section__zones_item_keys = set(data__section__zones_item.keys())
                                if "position" in data__section__zones_item_keys:
                                    data__section__zones_item_keys.remove("position")
                                    data__section__zones_item__position = data__section__zones_item["position"]
                                    validate___definitions_position(data__section__zones_item__position, custom_formats, (name_prefix or "data") + ".section.zones[{data__section__zones_x}].position".format(**locals()))
                                if "length" in data__section__zones_item_keys:
                                    data__section__zones_item_keys.remove("length")
                                    data__section__zones_item__length = data__section__zones_item["length"]
                                    validate___definitions_quantity(data__section__zones_item__length, custom_formats, (name_prefix or "data") + ".section.zones[{data__section__zones_x}].length".format(**locals()))
                                if "stiffness" in data__section__zones_item_keys:
                                    data__section__zones_item_keys.remove("stiffness")
                                    data__section__zones_item__stiffness = data__section__zones_item["stiffness"]
                                    validate___definitions_quantity(data__section__zones_item__stiffness, custom_formats, (name_prefix or "data") + ".section.zones[{data__section__zones_x}].stiffness".format(**locals()))
                                if data__section__zones_item_keys:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".section.zones[{data__section__zones_x}]".format(**locals()) + " must not contain "+str(data__section__zones_item_keys)+" properties")
                if "note" in data__section_keys:
                    data__section_keys.remove("note")
                    data__section__note = data__section["note"]
                    if not isinstance(data__section__note, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".section.note must be string")
                    if isinstance(data__section__note, str):
                        data__section__note_len = len(data__section__note)
                        if data__section__note_len > 500:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".section.note must be shorter than or equal to 500 characters")
                if data__section_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".section must not contain "+str(data__section_keys)+" properties")
        if "self_weight" in data_keys:
            data_keys.remove("self_weight")
            data__selfweight = data["self_weight"]
            if not isinstance(data__selfweight, (dict)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".self_weight must be object")
            data__selfweight_is_dict = isinstance(data__selfweight, dict)
            if data__selfweight_is_dict:
                data__selfweight__missing_keys = set(['answer', 'mass']) - data__selfweight.keys()
                if data__selfweight__missing_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".self_weight must contain ")
                data__selfweight_keys = set(data__selfweight.keys())
                if "answer" in data__selfweight_keys:
                    data__selfweight_keys.remove("answer")
                    data__selfweight__answer = data__selfweight["answer"]
                    if not (isinstance(data__selfweight__answer, str) and data__selfweight__answer == 'entered' or isinstance(data__selfweight__answer, str) and data__selfweight__answer == 'in_permanent' or isinstance(data__selfweight__answer, str) and data__selfweight__answer == 'not_known' or data__selfweight__answer is None):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".self_weight.answer must be one of ['entered', 'in_permanent', 'not_known', None]")
                if "mass" in data__selfweight_keys:
                    data__selfweight_keys.remove("mass")
                    data__selfweight__mass = data__selfweight["mass"]
                    validate___definitions_quantity(data__selfweight__mass, custom_formats, (name_prefix or "data") + ".self_weight.mass")
                if data__selfweight_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".self_weight must not contain "+str(data__selfweight_keys)+" properties")
        if "permanent" in data_keys:
            data_keys.remove("permanent")
            data__permanent = data["permanent"]
            if not isinstance(data__permanent, (dict)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".permanent must be object")
            data__permanent_is_dict = isinstance(data__permanent, dict)
            if data__permanent_is_dict:
                data__permanent__missing_keys = set(['answer']) - data__permanent.keys()
                if data__permanent__missing_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".permanent must contain ")
                data__permanent_keys = set(data__permanent.keys())
                if "answer" in data__permanent_keys:
                    data__permanent_keys.remove("answer")
                    data__permanent__answer = data__permanent["answer"]
                    if not (isinstance(data__permanent__answer, str) and data__permanent__answer == 'entered' or isinstance(data__permanent__answer, str) and data__permanent__answer == 'none' or isinstance(data__permanent__answer, str) and data__permanent__answer == 'not_known' or data__permanent__answer is None):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".permanent.answer must be one of ['entered', 'none', 'not_known', None]")
                if data__permanent_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".permanent must not contain "+str(data__permanent_keys)+" properties")
        if "restraint" in data_keys:
            data_keys.remove("restraint")
            data__restraint = data["restraint"]
            if not isinstance(data__restraint, (dict)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".restraint must be object")
            data__restraint_is_dict = isinstance(data__restraint, dict)
            if data__restraint_is_dict:
                data__restraint__missing_keys = set(['answer', 'spacing']) - data__restraint.keys()
                if data__restraint__missing_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".restraint must contain ")
                data__restraint_keys = set(data__restraint.keys())
                if "answer" in data__restraint_keys:
                    data__restraint_keys.remove("answer")
                    data__restraint__answer = data__restraint["answer"]
                    if not (isinstance(data__restraint__answer, str) and data__restraint__answer == 'full' or isinstance(data__restraint__answer, str) and data__restraint__answer == 'spacing' or isinstance(data__restraint__answer, str) and data__restraint__answer == 'not_seen' or data__restraint__answer is None):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".restraint.answer must be one of ['full', 'spacing', 'not_seen', None]")
                if "spacing" in data__restraint_keys:
                    data__restraint_keys.remove("spacing")
                    data__restraint__spacing = data__restraint["spacing"]
                    validate___definitions_quantity(data__restraint__spacing, custom_formats, (name_prefix or "data") + ".restraint.spacing")
                if data__restraint_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".restraint must not contain "+str(data__restraint_keys)+" properties")
        if "loads" in data_keys:
            data_keys.remove("loads")
            data__loads = data["loads"]
            if not isinstance(data__loads, (list, tuple)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads must be array")
            data__loads_is_list = isinstance(data__loads, (list, tuple))
            if data__loads_is_list:
                data__loads_len = len(data__loads)
                if data__loads_len > 200:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads must contain less than or equal to 200 items")
                for data__loads_x, data__loads_item in enumerate(data__loads):
                    if not isinstance(data__loads_item, (dict)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}]".format(**locals()) + " must be object")
                    data__loads_item_is_dict = isinstance(data__loads_item, dict)
                    if data__loads_item_is_dict:
                        data__loads_item__missing_keys = set(['id', 'name', 'category', 'form', 'magnitude', 'magnitude_end', 'position', 'length', 'whole_beam', 'source', 'removable', 'note', 'photos']) - data__loads_item.keys()
                        if data__loads_item__missing_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}]".format(**locals()) + " must contain ")
                        data__loads_item_keys = set(data__loads_item.keys())
                        if "id" in data__loads_item_keys:
                            data__loads_item_keys.remove("id")
                            data__loads_item__id = data__loads_item["id"]
                            if not isinstance(data__loads_item__id, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].id".format(**locals()) + " must be string")
                            if isinstance(data__loads_item__id, str):
                                data__loads_item__id_len = len(data__loads_item__id)
                                if data__loads_item__id_len < 1:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].id".format(**locals()) + " must be longer than or equal to 1 characters")
                                if data__loads_item__id_len > 64:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].id".format(**locals()) + " must be shorter than or equal to 64 characters")
                                if not REGEX_PATTERNS['^[A-Za-z0-9_.:-]+$'].search(data__loads_item__id):
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].id".format(**locals()) + " must match pattern ^[A-Za-z0-9_.:-]+$")
                        if "name" in data__loads_item_keys:
                            data__loads_item_keys.remove("name")
                            data__loads_item__name = data__loads_item["name"]
                            if not isinstance(data__loads_item__name, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].name".format(**locals()) + " must be string")
                            if isinstance(data__loads_item__name, str):
                                data__loads_item__name_len = len(data__loads_item__name)
                                if data__loads_item__name_len > 200:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].name".format(**locals()) + " must be shorter than or equal to 200 characters")
                        if "category" in data__loads_item_keys:
                            data__loads_item_keys.remove("category")
                            data__loads_item__category = data__loads_item["category"]
                            if not (isinstance(data__loads_item__category, str) and data__loads_item__category == 'permanent' or isinstance(data__loads_item__category, str) and data__loads_item__category == 'imposed' or isinstance(data__loads_item__category, str) and data__loads_item__category == 'stored' or isinstance(data__loads_item__category, str) and data__loads_item__category == 'roof' or isinstance(data__loads_item__category, str) and data__loads_item__category == 'snow' or isinstance(data__loads_item__category, str) and data__loads_item__category == 'water' or isinstance(data__loads_item__category, str) and data__loads_item__category == 'construction' or data__loads_item__category is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].category".format(**locals()) + " must be one of ['permanent', 'imposed', 'stored', 'roof', 'snow', 'water', 'construction', None]")
                        if "form" in data__loads_item_keys:
                            data__loads_item_keys.remove("form")
                            data__loads_item__form = data__loads_item["form"]
                            if not (isinstance(data__loads_item__form, str) and data__loads_item__form == 'point' or isinstance(data__loads_item__form, str) and data__loads_item__form == 'line' or isinstance(data__loads_item__form, str) and data__loads_item__form == 'moment' or data__loads_item__form is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].form".format(**locals()) + " must be one of ['point', 'line', 'moment', None]")
                        if "magnitude" in data__loads_item_keys:
                            data__loads_item_keys.remove("magnitude")
                            data__loads_item__magnitude = data__loads_item["magnitude"]
                            validate___definitions_quantity(data__loads_item__magnitude, custom_formats, (name_prefix or "data") + ".loads[{data__loads_x}].magnitude".format(**locals()))
                        if "magnitude_end" in data__loads_item_keys:
                            data__loads_item_keys.remove("magnitude_end")
                            data__loads_item__magnitudeend = data__loads_item["magnitude_end"]
                            validate___definitions_quantity(data__loads_item__magnitudeend, custom_formats, (name_prefix or "data") + ".loads[{data__loads_x}].magnitude_end".format(**locals()))
                        if "position" in data__loads_item_keys:
                            data__loads_item_keys.remove("position")
                            data__loads_item__position = data__loads_item["position"]
                            validate___definitions_position(data__loads_item__position, custom_formats, (name_prefix or "data") + ".loads[{data__loads_x}].position".format(**locals()))
                        if "length" in data__loads_item_keys:
                            data__loads_item_keys.remove("length")
                            data__loads_item__length = data__loads_item["length"]
                            validate___definitions_quantity(data__loads_item__length, custom_formats, (name_prefix or "data") + ".loads[{data__loads_x}].length".format(**locals()))
                        if "whole_beam" in data__loads_item_keys:
                            data__loads_item_keys.remove("whole_beam")
                            data__loads_item__wholebeam = data__loads_item["whole_beam"]
                            if not isinstance(data__loads_item__wholebeam, (bool)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].whole_beam".format(**locals()) + " must be boolean")
                        if "source" in data__loads_item_keys:
                            data__loads_item_keys.remove("source")
                            data__loads_item__source = data__loads_item["source"]
                            if not isinstance(data__loads_item__source, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].source".format(**locals()) + " must be string")
                            if isinstance(data__loads_item__source, str):
                                data__loads_item__source_len = len(data__loads_item__source)
                                if data__loads_item__source_len > 120:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].source".format(**locals()) + " must be shorter than or equal to 120 characters")
                        if "removable" in data__loads_item_keys:
                            data__loads_item_keys.remove("removable")
                            data__loads_item__removable = data__loads_item["removable"]
                            if not (isinstance(data__loads_item__removable, bool) and data__loads_item__removable is True or isinstance(data__loads_item__removable, bool) and data__loads_item__removable is False or data__loads_item__removable is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].removable".format(**locals()) + " must be one of [True, False, None]")
                        if "note" in data__loads_item_keys:
                            data__loads_item_keys.remove("note")
                            data__loads_item__note = data__loads_item["note"]
                            if not isinstance(data__loads_item__note, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].note".format(**locals()) + " must be string")
                            if isinstance(data__loads_item__note, str):
                                data__loads_item__note_len = len(data__loads_item__note)
                                if data__loads_item__note_len > 2000:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].note".format(**locals()) + " must be shorter than or equal to 2000 characters")
                        if "photos" in data__loads_item_keys:
                            data__loads_item_keys.remove("photos")
                            data__loads_item__photos = data__loads_item["photos"]
                            if not isinstance(data__loads_item__photos, (list, tuple)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].photos".format(**locals()) + " must be array")
                            data__loads_item__photos_is_list = isinstance(data__loads_item__photos, (list, tuple))
                            if data__loads_item__photos_is_list:
                                data__loads_item__photos_len = len(data__loads_item__photos)
                                if data__loads_item__photos_len > 40:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].photos".format(**locals()) + " must contain less than or equal to 40 items")
                                for data__loads_item__photos_x, data__loads_item__photos_item in enumerate(data__loads_item__photos):
                                    if not isinstance(data__loads_item__photos_item, (str)):
                                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].photos[{data__loads_item__photos_x}]".format(**locals()) + " must be string")
                                    if isinstance(data__loads_item__photos_item, str):
                                        if not REGEX_PATTERNS['^[0-9a-f]{64}$'].search(data__loads_item__photos_item):
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}].photos[{data__loads_item__photos_x}]".format(**locals()) + " must match pattern ^[0-9a-f]{64}$")
                        if data__loads_item_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".loads[{data__loads_x}]".format(**locals()) + " must not contain "+str(data__loads_item_keys)+" properties")
        if "limits" in data_keys:
            data_keys.remove("limits")
            data__limits = data["limits"]
            if not isinstance(data__limits, (list, tuple)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits must be array")
            data__limits_is_list = isinstance(data__limits, (list, tuple))
            if data__limits_is_list:
                data__limits_len = len(data__limits)
                if data__limits_len > 12:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits must contain less than or equal to 12 items")
                for data__limits_x, data__limits_item in enumerate(data__limits):
                    if not isinstance(data__limits_item, (dict)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}]".format(**locals()) + " must be object")
                    data__limits_item_is_dict = isinstance(data__limits_item, dict)
                    if data__limits_item_is_dict:
                        data__limits_item__missing_keys = set(['id', 'document', 'revision', 'issued_by', 'kind', 'basis', 'set', 'own', 'covers', 'covers_loads', 'span', 'span_rule', 'restraint', 'restraint_spacing', 'moment_at', 'entries']) - data__limits_item.keys()
                        if data__limits_item__missing_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}]".format(**locals()) + " must contain ")
                        data__limits_item_keys = set(data__limits_item.keys())
                        if "id" in data__limits_item_keys:
                            data__limits_item_keys.remove("id")
                            data__limits_item__id = data__limits_item["id"]
                            if not isinstance(data__limits_item__id, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].id".format(**locals()) + " must be string")
                            if isinstance(data__limits_item__id, str):
                                data__limits_item__id_len = len(data__limits_item__id)
                                if data__limits_item__id_len < 1:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].id".format(**locals()) + " must be longer than or equal to 1 characters")
                                if data__limits_item__id_len > 64:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].id".format(**locals()) + " must be shorter than or equal to 64 characters")
                                if not REGEX_PATTERNS['^[A-Za-z0-9_.:-]+$'].search(data__limits_item__id):
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].id".format(**locals()) + " must match pattern ^[A-Za-z0-9_.:-]+$")
                        if "document" in data__limits_item_keys:
                            data__limits_item_keys.remove("document")
                            data__limits_item__document = data__limits_item["document"]
                            if not isinstance(data__limits_item__document, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].document".format(**locals()) + " must be string")
                            if isinstance(data__limits_item__document, str):
                                data__limits_item__document_len = len(data__limits_item__document)
                                if data__limits_item__document_len > 200:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].document".format(**locals()) + " must be shorter than or equal to 200 characters")
                        if "revision" in data__limits_item_keys:
                            data__limits_item_keys.remove("revision")
                            data__limits_item__revision = data__limits_item["revision"]
                            if not isinstance(data__limits_item__revision, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].revision".format(**locals()) + " must be string")
                            if isinstance(data__limits_item__revision, str):
                                data__limits_item__revision_len = len(data__limits_item__revision)
                                if data__limits_item__revision_len > 40:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].revision".format(**locals()) + " must be shorter than or equal to 40 characters")
                        if "issued_by" in data__limits_item_keys:
                            data__limits_item_keys.remove("issued_by")
                            data__limits_item__issuedby = data__limits_item["issued_by"]
                            if not isinstance(data__limits_item__issuedby, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].issued_by".format(**locals()) + " must be string")
                            if isinstance(data__limits_item__issuedby, str):
                                data__limits_item__issuedby_len = len(data__limits_item__issuedby)
                                if data__limits_item__issuedby_len > 200:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].issued_by".format(**locals()) + " must be shorter than or equal to 200 characters")
                        if "kind" in data__limits_item_keys:
                            data__limits_item_keys.remove("kind")
                            data__limits_item__kind = data__limits_item["kind"]
                            if not (isinstance(data__limits_item__kind, str) and data__limits_item__kind == 'resistance' or isinstance(data__limits_item__kind, str) and data__limits_item__kind == 'design_effect' or data__limits_item__kind is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].kind".format(**locals()) + " must be one of ['resistance', 'design_effect', None]")
                        if "basis" in data__limits_item_keys:
                            data__limits_item_keys.remove("basis")
                            data__limits_item__basis = data__limits_item["basis"]
                            if not (isinstance(data__limits_item__basis, str) and data__limits_item__basis == 'factored' or isinstance(data__limits_item__basis, str) and data__limits_item__basis == 'unfactored' or isinstance(data__limits_item__basis, str) and data__limits_item__basis == 'not_known' or data__limits_item__basis is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].basis".format(**locals()) + " must be one of ['factored', 'unfactored', 'not_known', None]")
                        if "set" in data__limits_item_keys:
                            data__limits_item_keys.remove("set")
                            data__limits_item__set = data__limits_item["set"]
                            if not isinstance(data__limits_item__set, (str, NoneType)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].set".format(**locals()) + " must be string or null")
                            if isinstance(data__limits_item__set, str):
                                data__limits_item__set_len = len(data__limits_item__set)
                                if data__limits_item__set_len < 1:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].set".format(**locals()) + " must be longer than or equal to 1 characters")
                                if data__limits_item__set_len > 64:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].set".format(**locals()) + " must be shorter than or equal to 64 characters")
                                if not REGEX_PATTERNS['^[A-Za-z0-9_.:-]+$'].search(data__limits_item__set):
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].set".format(**locals()) + " must match pattern ^[A-Za-z0-9_.:-]+$")
                        if "own" in data__limits_item_keys:
                            data__limits_item_keys.remove("own")
                            data__limits_item__own = data__limits_item["own"]
                            if not isinstance(data__limits_item__own, (dict, NoneType)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].own".format(**locals()) + " must be object or null")
                            data__limits_item__own_is_dict = isinstance(data__limits_item__own, dict)
                            if data__limits_item__own_is_dict:
                                data__limits_item__own__missing_keys = set(['permanent', 'permanent_favourable', 'leading', 'accompanying']) - data__limits_item__own.keys()
                                if data__limits_item__own__missing_keys:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].own".format(**locals()) + " must contain ")
                                data__limits_item__own_keys = set(data__limits_item__own.keys())
                                if "permanent" in data__limits_item__own_keys:
                                    data__limits_item__own_keys.remove("permanent")
                                    data__limits_item__own__permanent = data__limits_item__own["permanent"]
                                    if not isinstance(data__limits_item__own__permanent, (str)):
                                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].own.permanent".format(**locals()) + " must be string")
                                    if isinstance(data__limits_item__own__permanent, str):
                                        data__limits_item__own__permanent_len = len(data__limits_item__own__permanent)
                                        if data__limits_item__own__permanent_len > 20:
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].own.permanent".format(**locals()) + " must be shorter than or equal to 20 characters")
                                if "permanent_favourable" in data__limits_item__own_keys:
                                    data__limits_item__own_keys.remove("permanent_favourable")
                                    data__limits_item__own__permanentfavourable = data__limits_item__own["permanent_favourable"]
                                    if not isinstance(data__limits_item__own__permanentfavourable, (str)):
                                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].own.permanent_favourable".format(**locals()) + " must be string")
                                    if isinstance(data__limits_item__own__permanentfavourable, str):
                                        data__limits_item__own__permanentfavourable_len = len(data__limits_item__own__permanentfavourable)
                                        if data__limits_item__own__permanentfavourable_len > 20:
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].own.permanent_favourable".format(**locals()) + " must be shorter than or equal to 20 characters")
                                if "leading" in data__limits_item__own_keys:
                                    data__limits_item__own_keys.remove("leading")
                                    data__limits_item__own__leading = data__limits_item__own["leading"]
                                    if not isinstance(data__limits_item__own__leading, (str)):
                                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].own.leading".format(**locals()) + " must be string")
                                    if isinstance(data__limits_item__own__leading, str):
                                        data__limits_item__own__leading_len = len(data__limits_item__own__leading)
                                        if data__limits_item__own__leading_len > 20:
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].own.leading".format(**locals()) + " must be shorter than or equal to 20 characters")
                                if "accompanying" in data__limits_item__own_keys:
                                    data__limits_item__own_keys.remove("accompanying")
                                    data__limits_item__own__accompanying = data__limits_item__own["accompanying"]
                                    if not isinstance(data__limits_item__own__accompanying, (str)):
                                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].own.accompanying".format(**locals()) + " must be string")
                                    if isinstance(data__limits_item__own__accompanying, str):
                                        data__limits_item__own__accompanying_len = len(data__limits_item__own__accompanying)
                                        if data__limits_item__own__accompanying_len > 20:
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].own.accompanying".format(**locals()) + " must be shorter than or equal to 20 characters")
                                if data__limits_item__own_keys:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].own".format(**locals()) + " must not contain "+str(data__limits_item__own_keys)+" properties")
                        if "covers" in data__limits_item_keys:
                            data__limits_item_keys.remove("covers")
                            data__limits_item__covers = data__limits_item["covers"]
                            if not (isinstance(data__limits_item__covers, str) and data__limits_item__covers == 'all' or isinstance(data__limits_item__covers, str) and data__limits_item__covers == 'all_but_self' or isinstance(data__limits_item__covers, str) and data__limits_item__covers == 'added' or data__limits_item__covers is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].covers".format(**locals()) + " must be one of ['all', 'all_but_self', 'added', None]")
                        if "covers_loads" in data__limits_item_keys:
                            data__limits_item_keys.remove("covers_loads")
                            data__limits_item__coversloads = data__limits_item["covers_loads"]
                            if not isinstance(data__limits_item__coversloads, (list, tuple)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].covers_loads".format(**locals()) + " must be array")
                            data__limits_item__coversloads_is_list = isinstance(data__limits_item__coversloads, (list, tuple))
                            if data__limits_item__coversloads_is_list:
                                data__limits_item__coversloads_len = len(data__limits_item__coversloads)
                                if data__limits_item__coversloads_len > 200:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].covers_loads".format(**locals()) + " must contain less than or equal to 200 items")
                                for data__limits_item__coversloads_x, data__limits_item__coversloads_item in enumerate(data__limits_item__coversloads):
                                    if not isinstance(data__limits_item__coversloads_item, (str)):
                                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].covers_loads[{data__limits_item__coversloads_x}]".format(**locals()) + " must be string")
                                    if isinstance(data__limits_item__coversloads_item, str):
                                        data__limits_item__coversloads_item_len = len(data__limits_item__coversloads_item)
                                        if data__limits_item__coversloads_item_len < 1:
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].covers_loads[{data__limits_item__coversloads_x}]".format(**locals()) + " must be longer than or equal to 1 characters")
                                        if data__limits_item__coversloads_item_len > 64:
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].covers_loads[{data__limits_item__coversloads_x}]".format(**locals()) + " must be shorter than or equal to 64 characters")
                                        if not REGEX_PATTERNS['^[A-Za-z0-9_.:-]+$'].search(data__limits_item__coversloads_item):
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].covers_loads[{data__limits_item__coversloads_x}]".format(**locals()) + " must match pattern ^[A-Za-z0-9_.:-]+$")
                        if "span" in data__limits_item_keys:
                            data__limits_item_keys.remove("span")
                            data__limits_item__span = data__limits_item["span"]
                            validate___definitions_quantity(data__limits_item__span, custom_formats, (name_prefix or "data") + ".limits[{data__limits_x}].span".format(**locals()))
                        if "span_rule" in data__limits_item_keys:
                            data__limits_item_keys.remove("span_rule")
                            data__limits_item__spanrule = data__limits_item["span_rule"]
                            if not (isinstance(data__limits_item__spanrule, str) and data__limits_item__spanrule == 'effective' or isinstance(data__limits_item__spanrule, str) and data__limits_item__spanrule == 'centres' or data__limits_item__spanrule is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].span_rule".format(**locals()) + " must be one of ['effective', 'centres', None]")
                        if "restraint" in data__limits_item_keys:
                            data__limits_item_keys.remove("restraint")
                            data__limits_item__restraint = data__limits_item["restraint"]
                            if not (isinstance(data__limits_item__restraint, str) and data__limits_item__restraint == 'full' or isinstance(data__limits_item__restraint, str) and data__limits_item__restraint == 'spacing' or isinstance(data__limits_item__restraint, str) and data__limits_item__restraint == 'not_stated' or data__limits_item__restraint is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].restraint".format(**locals()) + " must be one of ['full', 'spacing', 'not_stated', None]")
                        if "restraint_spacing" in data__limits_item_keys:
                            data__limits_item_keys.remove("restraint_spacing")
                            data__limits_item__restraintspacing = data__limits_item["restraint_spacing"]
                            validate___definitions_quantity(data__limits_item__restraintspacing, custom_formats, (name_prefix or "data") + ".limits[{data__limits_x}].restraint_spacing".format(**locals()))
                        if "moment_at" in data__limits_item_keys:
                            data__limits_item_keys.remove("moment_at")
                            data__limits_item__momentat = data__limits_item["moment_at"]
                            if not (isinstance(data__limits_item__momentat, str) and data__limits_item__momentat == 'centre' or isinstance(data__limits_item__momentat, str) and data__limits_item__momentat == 'face' or data__limits_item__momentat is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].moment_at".format(**locals()) + " must be one of ['centre', 'face', None]")
                        if "entries" in data__limits_item_keys:
                            data__limits_item_keys.remove("entries")
                            data__limits_item__entries = data__limits_item["entries"]
                            if not isinstance(data__limits_item__entries, (list, tuple)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries".format(**locals()) + " must be array")
                            data__limits_item__entries_is_list = isinstance(data__limits_item__entries, (list, tuple))
                            if data__limits_item__entries_is_list:
                                data__limits_item__entries_len = len(data__limits_item__entries)
                                if data__limits_item__entries_len > 80:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries".format(**locals()) + " must contain less than or equal to 80 items")
                                for data__limits_item__entries_x, data__limits_item__entries_item in enumerate(data__limits_item__entries):
                                    if not isinstance(data__limits_item__entries_item, (dict)):
                                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}]".format(**locals()) + " must be object")
                                    data__limits_item__entries_item_is_dict = isinstance(data__limits_item__entries_item, dict)
                                    if data__limits_item__entries_item_is_dict:
                                        data__limits_item__entries_item__missing_keys = set(['id', 'criterion', 'value', 'support', 'zone', 'width', 'sag_under']) - data__limits_item__entries_item.keys()
                                        if data__limits_item__entries_item__missing_keys:
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}]".format(**locals()) + " must contain ")
                                        data__limits_item__entries_item_keys = set(data__limits_item__entries_item.keys())
                                        if "id" in data__limits_item__entries_item_keys:
                                            data__limits_item__entries_item_keys.remove("id")
                                            data__limits_item__entries_item__id = data__limits_item__entries_item["id"]
                                            if not isinstance(data__limits_item__entries_item__id, (str)):
                                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].id".format(**locals()) + " must be string")
                                            if isinstance(data__limits_item__entries_item__id, str):
                                                data__limits_item__entries_item__id_len = len(data__limits_item__entries_item__id)
                                                if data__limits_item__entries_item__id_len < 1:
                                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].id".format(**locals()) + " must be longer than or equal to 1 characters")
                                                if data__limits_item__entries_item__id_len > 64:
                                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].id".format(**locals()) + " must be shorter than or equal to 64 characters")
                                                if not REGEX_PATTERNS['^[A-Za-z0-9_.:-]+$'].search(data__limits_item__entries_item__id):
                                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].id".format(**locals()) + " must match pattern ^[A-Za-z0-9_.:-]+$")
                                        if "criterion" in data__limits_item__entries_item_keys:
                                            data__limits_item__entries_item_keys.remove("criterion")
                                            data__limits_item__entries_item__criterion = data__limits_item__entries_item["criterion"]
                                            if not (isinstance(data__limits_item__entries_item__criterion, str) and data__limits_item__entries_item__criterion == 'sagging' or isinstance(data__limits_item__entries_item__criterion, str) and data__limits_item__entries_item__criterion == 'hogging' or isinstance(data__limits_item__entries_item__criterion, str) and data__limits_item__entries_item__criterion == 'shear' or isinstance(data__limits_item__entries_item__criterion, str) and data__limits_item__entries_item__criterion == 'reaction' or isinstance(data__limits_item__entries_item__criterion, str) and data__limits_item__entries_item__criterion == 'hold_down' or isinstance(data__limits_item__entries_item__criterion, str) and data__limits_item__entries_item__criterion == 'sag' or isinstance(data__limits_item__entries_item__criterion, str) and data__limits_item__entries_item__criterion == 'line_load' or isinstance(data__limits_item__entries_item__criterion, str) and data__limits_item__entries_item__criterion == 'area_load'):
                                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].criterion".format(**locals()) + " must be one of ['sagging', 'hogging', 'shear', 'reaction', 'hold_down', 'sag', 'line_load', 'area_load']")
                                        if "value" in data__limits_item__entries_item_keys:
                                            data__limits_item__entries_item_keys.remove("value")
                                            data__limits_item__entries_item__value = data__limits_item__entries_item["value"]
                                            validate___definitions_quantity(data__limits_item__entries_item__value, custom_formats, (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].value".format(**locals()))
                                        if "support" in data__limits_item__entries_item_keys:
                                            data__limits_item__entries_item_keys.remove("support")
                                            data__limits_item__entries_item__support = data__limits_item__entries_item["support"]
                                            if not isinstance(data__limits_item__entries_item__support, (int, NoneType)) and not (isinstance(data__limits_item__entries_item__support, float) and data__limits_item__entries_item__support.is_integer()) or isinstance(data__limits_item__entries_item__support, bool):
                                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].support".format(**locals()) + " must be integer or null")
                                            if isinstance(data__limits_item__entries_item__support, (int, float, Decimal)) and not isinstance(data__limits_item__entries_item__support, bool):
                                                if data__limits_item__entries_item__support < 0:
                                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].support".format(**locals()) + " must be bigger than or equal to 0")
                                                if data__limits_item__entries_item__support > 12:
                                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].support".format(**locals()) + " must be smaller than or equal to 12")
                                        if "zone" in data__limits_item__entries_item_keys:
                                            data__limits_item__entries_item_keys.remove("zone")
                                            data__limits_item__entries_item__zone = data__limits_item__entries_item["zone"]
                                            if not isinstance(data__limits_item__entries_item__zone, (dict, NoneType)):
                                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].zone".format(**locals()) + " must be object or null")
                                            data__limits_item__entries_item__zone_is_dict = isinstance(data__limits_item__entries_item__zone, dict)
                                            if data__limits_item__entries_item__zone_is_dict:
                                                data__limits_item__entries_item__zone__missing_keys = set(['position', 'length']) - data__limits_item__entries_item__zone.keys()
                                                if data__limits_item__entries_item__zone__missing_keys:
                                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].zone".format(**locals()) + " must contain ")
                                                data__limits_item__entries_item__zone_keys = set(data__limits_item__entries_item__zone.keys())
                                                if "position" in data__limits_item__entries_item__zone_keys:
                                                    data__limits_item__entries_item__zone_keys.remove("position")
                                                    data__limits_item__entries_item__zone__position = data__limits_item__entries_item__zone["position"]
                                                    validate___definitions_position(data__limits_item__entries_item__zone__position, custom_formats, (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].zone.position".format(**locals()))
                                                if "length" in data__limits_item__entries_item__zone_keys:
                                                    data__limits_item__entries_item__zone_keys.remove("length")
                                                    data__limits_item__entries_item__zone__length = data__limits_item__entries_item__zone["length"]
                                                    validate___definitions_quantity(data__limits_item__entries_item__zone__length, custom_formats, (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].zone.length".format(**locals()))
                                                if data__limits_item__entries_item__zone_keys:
                                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].zone".format(**locals()) + " must not contain "+str(data__limits_item__entries_item__zone_keys)+" properties")
                                        if "width" in data__limits_item__entries_item_keys:
                                            data__limits_item__entries_item_keys.remove("width")
                                            data__limits_item__entries_item__width = data__limits_item__entries_item["width"]
                                            validate___definitions_quantity(data__limits_item__entries_item__width, custom_formats, (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].width".format(**locals()))
                                        if "sag_under" in data__limits_item__entries_item_keys:
                                            data__limits_item__entries_item_keys.remove("sag_under")
                                            data__limits_item__entries_item__sagunder = data__limits_item__entries_item["sag_under"]
                                            if not (isinstance(data__limits_item__entries_item__sagunder, str) and data__limits_item__entries_item__sagunder == 'total' or isinstance(data__limits_item__entries_item__sagunder, str) and data__limits_item__entries_item__sagunder == 'added' or data__limits_item__entries_item__sagunder is None):
                                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}].sag_under".format(**locals()) + " must be one of ['total', 'added', None]")
                                        if data__limits_item__entries_item_keys:
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}].entries[{data__limits_item__entries_x}]".format(**locals()) + " must not contain "+str(data__limits_item__entries_item_keys)+" properties")
                        if data__limits_item_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".limits[{data__limits_x}]".format(**locals()) + " must not contain "+str(data__limits_item_keys)+" properties")
        if "condition" in data_keys:
            data_keys.remove("condition")
            data__condition = data["condition"]
            if not isinstance(data__condition, (dict)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition must be object")
            data__condition_is_dict = isinstance(data__condition, dict)
            if data__condition_is_dict:
                data__condition__missing_keys = set(['distress', 'distress_note', 'void', 'told']) - data__condition.keys()
                if data__condition__missing_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition must contain ")
                data__condition_keys = set(data__condition.keys())
                if "distress" in data__condition_keys:
                    data__condition_keys.remove("distress")
                    data__condition__distress = data__condition["distress"]
                    if not isinstance(data__condition__distress, (dict)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.distress must be object")
                    data__condition__distress_is_dict = isinstance(data__condition__distress, dict)
                    if data__condition__distress_is_dict:
                        data__condition__distress__missing_keys = set(['ends', 'midspan', 'underside']) - data__condition__distress.keys()
                        if data__condition__distress__missing_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.distress must contain ")
                        data__condition__distress_keys = set(data__condition__distress.keys())
                        if "ends" in data__condition__distress_keys:
                            data__condition__distress_keys.remove("ends")
                            data__condition__distress__ends = data__condition__distress["ends"]
                            if not (isinstance(data__condition__distress__ends, str) and data__condition__distress__ends == 'none' or isinstance(data__condition__distress__ends, str) and data__condition__distress__ends == 'something' or isinstance(data__condition__distress__ends, str) and data__condition__distress__ends == 'not_seen' or data__condition__distress__ends is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.distress.ends must be one of ['none', 'something', 'not_seen', None]")
                        if "midspan" in data__condition__distress_keys:
                            data__condition__distress_keys.remove("midspan")
                            data__condition__distress__midspan = data__condition__distress["midspan"]
                            if not (isinstance(data__condition__distress__midspan, str) and data__condition__distress__midspan == 'none' or isinstance(data__condition__distress__midspan, str) and data__condition__distress__midspan == 'something' or isinstance(data__condition__distress__midspan, str) and data__condition__distress__midspan == 'not_seen' or data__condition__distress__midspan is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.distress.midspan must be one of ['none', 'something', 'not_seen', None]")
                        if "underside" in data__condition__distress_keys:
                            data__condition__distress_keys.remove("underside")
                            data__condition__distress__underside = data__condition__distress["underside"]
                            if not (isinstance(data__condition__distress__underside, str) and data__condition__distress__underside == 'none' or isinstance(data__condition__distress__underside, str) and data__condition__distress__underside == 'something' or isinstance(data__condition__distress__underside, str) and data__condition__distress__underside == 'not_seen' or data__condition__distress__underside is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.distress.underside must be one of ['none', 'something', 'not_seen', None]")
                        if data__condition__distress_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.distress must not contain "+str(data__condition__distress_keys)+" properties")
                if "distress_note" in data__condition_keys:
                    data__condition_keys.remove("distress_note")
                    data__condition__distressnote = data__condition["distress_note"]
                    if not isinstance(data__condition__distressnote, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.distress_note must be string")
                    if isinstance(data__condition__distressnote, str):
                        data__condition__distressnote_len = len(data__condition__distressnote)
                        if data__condition__distressnote_len > 2000:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.distress_note must be shorter than or equal to 2000 characters")
                if "void" in data__condition_keys:
                    data__condition_keys.remove("void")
                    data__condition__void = data__condition["void"]
                    if not isinstance(data__condition__void, (dict)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.void must be object")
                    data__condition__void_is_dict = isinstance(data__condition__void, dict)
                    if data__condition__void_is_dict:
                        data__condition__void__missing_keys = set(['answer', 'which', 'note']) - data__condition__void.keys()
                        if data__condition__void__missing_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.void must contain ")
                        data__condition__void_keys = set(data__condition__void.keys())
                        if "answer" in data__condition__void_keys:
                            data__condition__void_keys.remove("answer")
                            data__condition__void__answer = data__condition__void["answer"]
                            if not (isinstance(data__condition__void__answer, str) and data__condition__void__answer == 'none' or isinstance(data__condition__void__answer, str) and data__condition__void__answer == 'some' or isinstance(data__condition__void__answer, str) and data__condition__void__answer == 'not_looked' or data__condition__void__answer is None):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.void.answer must be one of ['none', 'some', 'not_looked', None]")
                        if "which" in data__condition__void_keys:
                            data__condition__void_keys.remove("which")
                            data__condition__void__which = data__condition__void["which"]
                            if not isinstance(data__condition__void__which, (list, tuple)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.void.which must be array")
                            data__condition__void__which_is_list = isinstance(data__condition__void__which, (list, tuple))
                            if data__condition__void__which_is_list:
                                data__condition__void__which_len = len(data__condition__void__which)
                                if data__condition__void__which_len > 60:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.void.which must contain less than or equal to 60 items")
                                for data__condition__void__which_x, data__condition__void__which_item in enumerate(data__condition__void__which):
                                    if not isinstance(data__condition__void__which_item, (str)):
                                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.void.which[{data__condition__void__which_x}]".format(**locals()) + " must be string")
                                    if isinstance(data__condition__void__which_item, str):
                                        data__condition__void__which_item_len = len(data__condition__void__which_item)
                                        if data__condition__void__which_item_len < 1:
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.void.which[{data__condition__void__which_x}]".format(**locals()) + " must be longer than or equal to 1 characters")
                                        if data__condition__void__which_item_len > 64:
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.void.which[{data__condition__void__which_x}]".format(**locals()) + " must be shorter than or equal to 64 characters")
                                        if not REGEX_PATTERNS['^[A-Za-z0-9_.:-]+$'].search(data__condition__void__which_item):
                                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.void.which[{data__condition__void__which_x}]".format(**locals()) + " must match pattern ^[A-Za-z0-9_.:-]+$")
                        if "note" in data__condition__void_keys:
                            data__condition__void_keys.remove("note")
                            data__condition__void__note = data__condition__void["note"]
                            if not isinstance(data__condition__void__note, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.void.note must be string")
                            if isinstance(data__condition__void__note, str):
                                data__condition__void__note_len = len(data__condition__void__note)
                                if data__condition__void__note_len > 2000:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.void.note must be shorter than or equal to 2000 characters")
                        if data__condition__void_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.void must not contain "+str(data__condition__void_keys)+" properties")
                if "told" in data__condition_keys:
                    data__condition_keys.remove("told")
                    data__condition__told = data__condition["told"]
                    if not isinstance(data__condition__told, (dict, NoneType)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.told must be object or null")
                    data__condition__told_is_dict = isinstance(data__condition__told, dict)
                    if data__condition__told_is_dict:
                        data__condition__told__missing_keys = set(['name', 'time']) - data__condition__told.keys()
                        if data__condition__told__missing_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.told must contain ")
                        data__condition__told_keys = set(data__condition__told.keys())
                        if "name" in data__condition__told_keys:
                            data__condition__told_keys.remove("name")
                            data__condition__told__name = data__condition__told["name"]
                            if not isinstance(data__condition__told__name, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.told.name must be string")
                            if isinstance(data__condition__told__name, str):
                                data__condition__told__name_len = len(data__condition__told__name)
                                if data__condition__told__name_len > 120:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.told.name must be shorter than or equal to 120 characters")
                        if "time" in data__condition__told_keys:
                            data__condition__told_keys.remove("time")
                            data__condition__told__time = data__condition__told["time"]
                            if not isinstance(data__condition__told__time, (str, NoneType)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.told.time must be string or null")
                            if isinstance(data__condition__told__time, str):
                                data__condition__told__time_len = len(data__condition__told__time)
                                if data__condition__told__time_len > 40:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.told.time must be shorter than or equal to 40 characters")
                                if not REGEX_PATTERNS['^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$'].search(data__condition__told__time):
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.told.time must match pattern ^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$")
                        if data__condition__told_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition.told must not contain "+str(data__condition__told_keys)+" properties")
                if data__condition_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".condition must not contain "+str(data__condition_keys)+" properties")
        if "photos" in data_keys:
            data_keys.remove("photos")
            data__photos = data["photos"]
            if not isinstance(data__photos, (list, tuple)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos must be array")
            data__photos_is_list = isinstance(data__photos, (list, tuple))
            if data__photos_is_list:
                data__photos_len = len(data__photos)
                if data__photos_len > 400:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos must contain less than or equal to 400 items")
                for data__photos_x, data__photos_item in enumerate(data__photos):
                    if not isinstance(data__photos_item, (dict)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}]".format(**locals()) + " must be object")
                    data__photos_item_is_dict = isinstance(data__photos_item, dict)
                    if data__photos_item_is_dict:
                        data__photos_item__missing_keys = set(['hash', 'name', 'type', 'bytes', 'note', 'load', 'taken']) - data__photos_item.keys()
                        if data__photos_item__missing_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}]".format(**locals()) + " must contain ")
                        data__photos_item_keys = set(data__photos_item.keys())
                        if "hash" in data__photos_item_keys:
                            data__photos_item_keys.remove("hash")
                            data__photos_item__hash = data__photos_item["hash"]
                            if not isinstance(data__photos_item__hash, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].hash".format(**locals()) + " must be string")
                            if isinstance(data__photos_item__hash, str):
                                if not REGEX_PATTERNS['^[0-9a-f]{64}$'].search(data__photos_item__hash):
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].hash".format(**locals()) + " must match pattern ^[0-9a-f]{64}$")
                        if "name" in data__photos_item_keys:
                            data__photos_item_keys.remove("name")
                            data__photos_item__name = data__photos_item["name"]
                            if not isinstance(data__photos_item__name, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].name".format(**locals()) + " must be string")
                            if isinstance(data__photos_item__name, str):
                                data__photos_item__name_len = len(data__photos_item__name)
                                if data__photos_item__name_len > 200:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].name".format(**locals()) + " must be shorter than or equal to 200 characters")
                        if "type" in data__photos_item_keys:
                            data__photos_item_keys.remove("type")
                            data__photos_item__type = data__photos_item["type"]
                            if not isinstance(data__photos_item__type, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].type".format(**locals()) + " must be string")
                            if isinstance(data__photos_item__type, str):
                                data__photos_item__type_len = len(data__photos_item__type)
                                if data__photos_item__type_len > 80:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].type".format(**locals()) + " must be shorter than or equal to 80 characters")
                        if "bytes" in data__photos_item_keys:
                            data__photos_item_keys.remove("bytes")
                            data__photos_item__bytes = data__photos_item["bytes"]
                            if not isinstance(data__photos_item__bytes, (int)) and not (isinstance(data__photos_item__bytes, float) and data__photos_item__bytes.is_integer()) or isinstance(data__photos_item__bytes, bool):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].bytes".format(**locals()) + " must be integer")
                            if isinstance(data__photos_item__bytes, (int, float, Decimal)) and not isinstance(data__photos_item__bytes, bool):
                                if data__photos_item__bytes < 0:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].bytes".format(**locals()) + " must be bigger than or equal to 0")
                                if data__photos_item__bytes > 200000000:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].bytes".format(**locals()) + " must be smaller than or equal to 200000000")
                        if "note" in data__photos_item_keys:
                            data__photos_item_keys.remove("note")
                            data__photos_item__note = data__photos_item["note"]
                            if not isinstance(data__photos_item__note, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].note".format(**locals()) + " must be string")
                            if isinstance(data__photos_item__note, str):
                                data__photos_item__note_len = len(data__photos_item__note)
                                if data__photos_item__note_len > 2000:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].note".format(**locals()) + " must be shorter than or equal to 2000 characters")
                        if "load" in data__photos_item_keys:
                            data__photos_item_keys.remove("load")
                            data__photos_item__load = data__photos_item["load"]
                            if not isinstance(data__photos_item__load, (str, NoneType)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].load".format(**locals()) + " must be string or null")
                            if isinstance(data__photos_item__load, str):
                                data__photos_item__load_len = len(data__photos_item__load)
                                if data__photos_item__load_len < 1:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].load".format(**locals()) + " must be longer than or equal to 1 characters")
                                if data__photos_item__load_len > 64:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].load".format(**locals()) + " must be shorter than or equal to 64 characters")
                                if not REGEX_PATTERNS['^[A-Za-z0-9_.:-]+$'].search(data__photos_item__load):
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].load".format(**locals()) + " must match pattern ^[A-Za-z0-9_.:-]+$")
                        if "taken" in data__photos_item_keys:
                            data__photos_item_keys.remove("taken")
                            data__photos_item__taken = data__photos_item["taken"]
                            if not isinstance(data__photos_item__taken, (str)):
                                raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].taken".format(**locals()) + " must be string")
                            if isinstance(data__photos_item__taken, str):
                                data__photos_item__taken_len = len(data__photos_item__taken)
                                if data__photos_item__taken_len > 40:
                                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}].taken".format(**locals()) + " must be shorter than or equal to 40 characters")
                        if data__photos_item_keys:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".photos[{data__photos_x}]".format(**locals()) + " must not contain "+str(data__photos_item_keys)+" properties")
        if "decision" in data_keys:
            data_keys.remove("decision")
            data__decision = data["decision"]
            if not isinstance(data__decision, (dict, NoneType)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".decision must be object or null")
            data__decision_is_dict = isinstance(data__decision, dict)
            if data__decision_is_dict:
                data__decision__missing_keys = set(['choice', 'name', 'time']) - data__decision.keys()
                if data__decision__missing_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".decision must contain ")
                data__decision_keys = set(data__decision.keys())
                if "choice" in data__decision_keys:
                    data__decision_keys.remove("choice")
                    data__decision__choice = data__decision["choice"]
                    if not isinstance(data__decision__choice, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".decision.choice must be string")
                    if isinstance(data__decision__choice, str):
                        data__decision__choice_len = len(data__decision__choice)
                        if data__decision__choice_len < 1:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".decision.choice must be longer than or equal to 1 characters")
                        if data__decision__choice_len > 64:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".decision.choice must be shorter than or equal to 64 characters")
                        if not REGEX_PATTERNS['^[A-Za-z0-9_.:-]+$'].search(data__decision__choice):
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".decision.choice must match pattern ^[A-Za-z0-9_.:-]+$")
                if "name" in data__decision_keys:
                    data__decision_keys.remove("name")
                    data__decision__name = data__decision["name"]
                    if not isinstance(data__decision__name, (str)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".decision.name must be string")
                    if isinstance(data__decision__name, str):
                        data__decision__name_len = len(data__decision__name)
                        if data__decision__name_len > 120:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".decision.name must be shorter than or equal to 120 characters")
                if "time" in data__decision_keys:
                    data__decision_keys.remove("time")
                    data__decision__time = data__decision["time"]
                    if not isinstance(data__decision__time, (str, NoneType)):
                        raise JsonSchemaValueException("" + (name_prefix or "data") + ".decision.time must be string or null")
                    if isinstance(data__decision__time, str):
                        data__decision__time_len = len(data__decision__time)
                        if data__decision__time_len > 40:
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".decision.time must be shorter than or equal to 40 characters")
                        if not REGEX_PATTERNS['^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$'].search(data__decision__time):
                            raise JsonSchemaValueException("" + (name_prefix or "data") + ".decision.time must match pattern ^\\d{4}-\\d\\d-\\d\\dT\\d\\d:\\d\\d(:\\d\\d(\\.\\d+)?)?(Z|[+-]\\d\\d:\\d\\d)?$")
                if data__decision_keys:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".decision must not contain "+str(data__decision_keys)+" properties")
        if "notes" in data_keys:
            data_keys.remove("notes")
            data__notes = data["notes"]
            if not isinstance(data__notes, (str)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".notes must be string")
            if isinstance(data__notes, str):
                data__notes_len = len(data__notes)
                if data__notes_len > 10000:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".notes must be shorter than or equal to 10000 characters")
        if data_keys:
            raise JsonSchemaValueException("" + (name_prefix or "data") + " must not contain "+str(data_keys)+" properties")
    return data

def validate___definitions_position(data, custom_formats={}, name_prefix=None):
    if not isinstance(data, (dict, NoneType)):
        raise JsonSchemaValueException("" + (name_prefix or "data") + " must be object or null")
    data_is_dict = isinstance(data, dict)
    if data_is_dict:
        data__missing_keys = set(['from', 'support', 'side', 'at', 'to', 'distance']) - data.keys()
        if data__missing_keys:
            raise JsonSchemaValueException("" + (name_prefix or "data") + " must contain ")
        data_keys = set(data.keys())
        if "from" in data_keys:
            data_keys.remove("from")
            data__from = data["from"]
            if not (isinstance(data__from, str) and data__from == 'left_end' or isinstance(data__from, str) and data__from == 'right_end' or isinstance(data__from, str) and data__from == 'support' or data__from is None):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".from must be one of ['left_end', 'right_end', 'support', None]")
        if "support" in data_keys:
            data_keys.remove("support")
            data__support = data["support"]
            if not isinstance(data__support, (int, NoneType)) and not (isinstance(data__support, float) and data__support.is_integer()) or isinstance(data__support, bool):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".support must be integer or null")
            if isinstance(data__support, (int, float, Decimal)) and not isinstance(data__support, bool):
                if data__support < 0:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".support must be bigger than or equal to 0")
                if data__support > 12:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".support must be smaller than or equal to 12")
        if "side" in data_keys:
            data_keys.remove("side")
            data__side = data["side"]
            if not (isinstance(data__side, str) and data__side == 'right' or isinstance(data__side, str) and data__side == 'left' or data__side is None):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".side must be one of ['right', 'left', None]")
        if "at" in data_keys:
            data_keys.remove("at")
            data__at = data["at"]
            if not (isinstance(data__at, str) and data__at == 'centre' or isinstance(data__at, str) and data__at == 'face' or data__at is None):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".at must be one of ['centre', 'face', None]")
        if "to" in data_keys:
            data_keys.remove("to")
            data__to = data["to"]
            if not (isinstance(data__to, str) and data__to == 'middle' or isinstance(data__to, str) and data__to == 'near_edge' or data__to is None):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".to must be one of ['middle', 'near_edge', None]")
        if "distance" in data_keys:
            data_keys.remove("distance")
            data__distance = data["distance"]
            validate___definitions_quantity(data__distance, custom_formats, (name_prefix or "data") + ".distance")
        if data_keys:
            raise JsonSchemaValueException("" + (name_prefix or "data") + " must not contain "+str(data_keys)+" properties")
    return data

def validate___definitions_quantity(data, custom_formats={}, name_prefix=None):
    if not isinstance(data, (dict, NoneType)):
        raise JsonSchemaValueException("" + (name_prefix or "data") + " must be object or null")
    data_is_dict = isinstance(data, dict)
    if data_is_dict:
        data__missing_keys = set(['text']) - data.keys()
        if data__missing_keys:
            raise JsonSchemaValueException("" + (name_prefix or "data") + " must contain ")
        data_keys = set(data.keys())
        if "text" in data_keys:
            data_keys.remove("text")
            data__text = data["text"]
            if not isinstance(data__text, (str)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".text must be string")
            if isinstance(data__text, str):
                data__text_len = len(data__text)
                if data__text_len > 40:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".text must be shorter than or equal to 40 characters")
        if "unit" in data_keys:
            data_keys.remove("unit")
            data__unit = data["unit"]
            if not isinstance(data__unit, (str)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".unit must be string")
            if isinstance(data__unit, str):
                data__unit_len = len(data__unit)
                if data__unit_len > 16:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".unit must be shorter than or equal to 16 characters")
        if "means" in data_keys:
            data_keys.remove("means")
            data__means = data["means"]
            if not isinstance(data__means, (str, NoneType)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".means must be string or null")
            if isinstance(data__means, str):
                data__means_len = len(data__means)
                if data__means_len > 20:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".means must be shorter than or equal to 20 characters")
        if "low" in data_keys:
            data_keys.remove("low")
            data__low = data["low"]
            if not isinstance(data__low, (str)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".low must be string")
            if isinstance(data__low, str):
                data__low_len = len(data__low)
                if data__low_len > 40:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".low must be shorter than or equal to 40 characters")
        if "high" in data_keys:
            data_keys.remove("high")
            data__high = data["high"]
            if not isinstance(data__high, (str)):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".high must be string")
            if isinstance(data__high, str):
                data__high_len = len(data__high)
                if data__high_len > 40:
                    raise JsonSchemaValueException("" + (name_prefix or "data") + ".high must be shorter than or equal to 40 characters")
        if "value" in data_keys:
            data_keys.remove("value")
            data__value = data["value"]
            if not isinstance(data__value, (int, float, Decimal, NoneType)) or isinstance(data__value, bool):
                raise JsonSchemaValueException("" + (name_prefix or "data") + ".value must be number or null")
        if data_keys:
            raise JsonSchemaValueException("" + (name_prefix or "data") + " must not contain "+str(data_keys)+" properties")
    return data
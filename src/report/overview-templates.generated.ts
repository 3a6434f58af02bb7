// Generated from templates/ by templates/generate.ts. Change a template, then: npx tsx templates/generate.ts
// @ts-nocheck
export const OVERVIEW_HTML: unknown = {"0":function(container,depth0,helpers,partials,data) {
    return "<p>"
    + container.escapeExpression(container.lambda(depth0, depth0))
    + "</p>\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"beware\">\n<h2>Look at these first</h2>\n<ol>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"failures"),{"name":"each","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":32,"column":0},"end":{"line":34,"column":9}}})) != null ? stack1 : "")
    + "</ol>\n</div>\n";
},"2":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<li><strong>"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":33,"column":14},"end":{"line":33,"column":18}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":33,"column":12},"end":{"line":33,"column":20}}}) : helper)))
    + "</strong>: "
    + alias4((((helper = lookupProperty(helpers,"outcome") || alias1(depth0, "outcome", {"start":{"line":33,"column":33},"end":{"line":33,"column":40}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"outcome","hash":{},"data":data,"loc":{"start":{"line":33,"column":31},"end":{"line":33,"column":42}}}) : helper)))
    + ". "
    + alias4((((helper = lookupProperty(helpers,"why") || alias1(depth0, "why", {"start":{"line":33,"column":46},"end":{"line":33,"column":49}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"why","hash":{},"data":data,"loc":{"start":{"line":33,"column":44},"end":{"line":33,"column":51}}}) : helper)))
    + "</li>\n";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<section id=\"changes\" aria-labelledby=\"changes-heading\">\n<h2 id=\"changes-heading\"><span class=\"no\">1</span> What changed since the earlier records?</h2>\n<div class=\"scroll long\" tabindex=\"0\" role=\"region\" aria-label=\"Changes since the earlier records\">\n<table>\n<caption>Runs against their earlier records: first what is not done, then other choices, then by the largest move</caption>\n<thead><tr><th scope=\"col\">run</th><th scope=\"col\">outcome</th><th scope=\"col\">choice</th><th scope=\"col\">moved most</th><th scope=\"col\" class=\"n\">by, in earlier standard errors</th><th scope=\"col\" class=\"n\">new rows inside</th><th scope=\"col\" class=\"n\">criteria met</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"changes"),"rows"),{"name":"each","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":48,"column":0},"end":{"line":50,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n<p class=\"small\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"changes"), "note", {"start":{"line":54,"column":19},"end":{"line":54,"column":31}} ), depth0))
    + "</p>\n</section>\n";
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), alias2=container.strict, alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr"
    + ((stack1 = lookupProperty(helpers,"unless").call(alias1,lookupProperty(depth0,"done"),{"name":"unless","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":49,"column":3},"end":{"line":49,"column":45}}})) != null ? stack1 : "")
    + "><th scope=\"row\">"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"link"),{"name":"if","hash":{},"fn":container.program(6, data, 0),"inverse":container.program(7, data, 0),"data":data,"loc":{"start":{"line":49,"column":62},"end":{"line":49,"column":128}}})) != null ? stack1 : "")
    + "</th><td><span class=\"verdict\">"
    + alias4((((helper = lookupProperty(helpers,"outcome") || alias2(depth0, "outcome", {"start":{"line":49,"column":161},"end":{"line":49,"column":168}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"outcome","hash":{},"data":data,"loc":{"start":{"line":49,"column":159},"end":{"line":49,"column":170}}}) : helper)))
    + "</span></td><td>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"marked"),{"name":"if","hash":{},"fn":container.program(8, data, 0),"inverse":container.program(9, data, 0),"data":data,"loc":{"start":{"line":49,"column":186},"end":{"line":49,"column":252}}})) != null ? stack1 : "")
    + "</td><td>"
    + alias4((((helper = lookupProperty(helpers,"moved") || alias2(depth0, "moved", {"start":{"line":49,"column":263},"end":{"line":49,"column":268}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"moved","hash":{},"data":data,"loc":{"start":{"line":49,"column":261},"end":{"line":49,"column":270}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"errors") || alias2(depth0, "errors", {"start":{"line":49,"column":291},"end":{"line":49,"column":297}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"errors","hash":{},"data":data,"loc":{"start":{"line":49,"column":289},"end":{"line":49,"column":299}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"inside") || alias2(depth0, "inside", {"start":{"line":49,"column":320},"end":{"line":49,"column":326}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"inside","hash":{},"data":data,"loc":{"start":{"line":49,"column":318},"end":{"line":49,"column":328}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"criteria") || alias2(depth0, "criteria", {"start":{"line":49,"column":349},"end":{"line":49,"column":357}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"criteria","hash":{},"data":data,"loc":{"start":{"line":49,"column":347},"end":{"line":49,"column":359}}}) : helper)))
    + "</td></tr>\n";
},"5":function(container,depth0,helpers,partials,data) {
    return " class=\"missed\"";
},"6":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<a href=\""
    + alias4((((helper = lookupProperty(helpers,"link") || alias1(depth0, "link", {"start":{"line":49,"column":85},"end":{"line":49,"column":89}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"link","hash":{},"data":data,"loc":{"start":{"line":49,"column":83},"end":{"line":49,"column":91}}}) : helper)))
    + "\">"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":49,"column":95},"end":{"line":49,"column":99}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":49,"column":93},"end":{"line":49,"column":101}}}) : helper)))
    + "</a>";
},"7":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return container.escapeExpression((((helper = lookupProperty(helpers,"name") || container.strict(depth0, "name", {"start":{"line":49,"column":115},"end":{"line":49,"column":119}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"name","hash":{},"data":data,"loc":{"start":{"line":49,"column":113},"end":{"line":49,"column":121}}}) : helper)));
},"8":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<strong>"
    + container.escapeExpression((((helper = lookupProperty(helpers,"choice") || container.strict(depth0, "choice", {"start":{"line":49,"column":210},"end":{"line":49,"column":216}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"choice","hash":{},"data":data,"loc":{"start":{"line":49,"column":208},"end":{"line":49,"column":218}}}) : helper)))
    + "</strong>";
},"9":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return container.escapeExpression((((helper = lookupProperty(helpers,"choice") || container.strict(depth0, "choice", {"start":{"line":49,"column":237},"end":{"line":49,"column":243}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"choice","hash":{},"data":data,"loc":{"start":{"line":49,"column":235},"end":{"line":49,"column":245}}}) : helper)));
},"10":function(container,depth0,helpers,partials,data) {
    return "2";
},"11":function(container,depth0,helpers,partials,data) {
    return "1";
},"12":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), alias2=container.strict, alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr"
    + ((stack1 = lookupProperty(helpers,"unless").call(alias1,lookupProperty(depth0,"done"),{"name":"unless","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":65,"column":3},"end":{"line":65,"column":45}}})) != null ? stack1 : "")
    + "><th scope=\"row\">"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"link"),{"name":"if","hash":{},"fn":container.program(6, data, 0),"inverse":container.program(7, data, 0),"data":data,"loc":{"start":{"line":65,"column":62},"end":{"line":65,"column":128}}})) != null ? stack1 : "")
    + "</th><td><span class=\"verdict\">"
    + alias4((((helper = lookupProperty(helpers,"outcome") || alias2(depth0, "outcome", {"start":{"line":65,"column":161},"end":{"line":65,"column":168}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"outcome","hash":{},"data":data,"loc":{"start":{"line":65,"column":159},"end":{"line":65,"column":170}}}) : helper)))
    + "</span></td><td>"
    + alias4((((helper = lookupProperty(helpers,"chosen") || alias2(depth0, "chosen", {"start":{"line":65,"column":188},"end":{"line":65,"column":194}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"chosen","hash":{},"data":data,"loc":{"start":{"line":65,"column":186},"end":{"line":65,"column":196}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"rows") || alias2(depth0, "rows", {"start":{"line":65,"column":217},"end":{"line":65,"column":221}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"rows","hash":{},"data":data,"loc":{"start":{"line":65,"column":215},"end":{"line":65,"column":223}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"adjusted") || alias2(depth0, "adjusted", {"start":{"line":65,"column":244},"end":{"line":65,"column":252}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"adjusted","hash":{},"data":data,"loc":{"start":{"line":65,"column":242},"end":{"line":65,"column":254}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"error") || alias2(depth0, "error", {"start":{"line":65,"column":275},"end":{"line":65,"column":280}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"error","hash":{},"data":data,"loc":{"start":{"line":65,"column":273},"end":{"line":65,"column":282}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"criteria") || alias2(depth0, "criteria", {"start":{"line":65,"column":303},"end":{"line":65,"column":311}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"criteria","hash":{},"data":data,"loc":{"start":{"line":65,"column":301},"end":{"line":65,"column":313}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"concerns") || alias2(depth0, "concerns", {"start":{"line":65,"column":334},"end":{"line":65,"column":342}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"concerns","hash":{},"data":data,"loc":{"start":{"line":65,"column":332},"end":{"line":65,"column":344}}}) : helper)))
    + "</td></tr>\n";
},"13":function(container,depth0,helpers,partials,data) {
    return "3";
},"14":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\"Coefficients side by side\">\n<table>\n<caption>Coefficients for "
    + container.escapeExpression((((helper = lookupProperty(helpers,"quantity") || container.strict(depth0, "quantity", {"start":{"line":77,"column":28},"end":{"line":77,"column":36}} ))),(typeof helper === "function" ? helper.call(alias1,{"name":"quantity","hash":{},"data":data,"loc":{"start":{"line":77,"column":26},"end":{"line":77,"column":38}}}) : helper)))
    + ", each with its standard error beneath</caption>\n<thead><tr><th scope=\"col\">run</th>"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"names"),{"name":"each","hash":{},"fn":container.program(15, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":78,"column":35},"end":{"line":78,"column":98}}})) != null ? stack1 : "")
    + "</tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"runs"),{"name":"each","hash":{},"fn":container.program(16, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":80,"column":0},"end":{"line":82,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"more"),{"name":"if","hash":{},"fn":container.program(19, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":86,"column":0},"end":{"line":88,"column":7}}})) != null ? stack1 : "");
},"15":function(container,depth0,helpers,partials,data) {
    return "<th scope=\"col\" class=\"n\">"
    + container.escapeExpression(container.lambda(depth0, depth0))
    + "</th>";
},"16":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"name") || container.strict(depth0, "name", {"start":{"line":81,"column":22},"end":{"line":81,"column":26}} ))),(typeof helper === "function" ? helper.call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":81,"column":20},"end":{"line":81,"column":28}}}) : helper)))
    + "</th>"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"cells"),{"name":"each","hash":{},"fn":container.program(17, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":81,"column":33},"end":{"line":81,"column":144}}})) != null ? stack1 : "")
    + "</tr>\n";
},"17":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<td class=\"n\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"estimate") || container.strict(depth0, "estimate", {"start":{"line":81,"column":64},"end":{"line":81,"column":72}} ))),(typeof helper === "function" ? helper.call(alias1,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":81,"column":62},"end":{"line":81,"column":74}}}) : helper)))
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"error"),{"name":"if","hash":{},"fn":container.program(18, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":81,"column":74},"end":{"line":81,"column":130}}})) != null ? stack1 : "")
    + "</td>";
},"18":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<span class=\"under\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"error") || container.strict(depth0, "error", {"start":{"line":81,"column":109},"end":{"line":81,"column":114}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"error","hash":{},"data":data,"loc":{"start":{"line":81,"column":107},"end":{"line":81,"column":116}}}) : helper)))
    + "</span>";
},"19":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"small\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"more") || container.strict(depth0, "more", {"start":{"line":87,"column":19},"end":{"line":87,"column":23}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"more","hash":{},"data":data,"loc":{"start":{"line":87,"column":17},"end":{"line":87,"column":25}}}) : helper)))
    + "</p>\n";
},"20":function(container,depth0,helpers,partials,data) {
    return "<p>No two runs share a coefficient for the same quantity.</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<!doctype html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n<meta name=\"color-scheme\" content=\"light dark\">\n<meta name=\"generator\" content=\""
    + alias4((((helper = lookupProperty(helpers,"tool") || alias1(depth0, "tool", {"start":{"line":7,"column":34},"end":{"line":7,"column":38}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"tool","hash":{},"data":data,"loc":{"start":{"line":7,"column":32},"end":{"line":7,"column":40}}}) : helper)))
    + "\">\n<title>"
    + alias4((((helper = lookupProperty(helpers,"title") || alias1(depth0, "title", {"start":{"line":8,"column":9},"end":{"line":8,"column":14}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"title","hash":{},"data":data,"loc":{"start":{"line":8,"column":7},"end":{"line":8,"column":16}}}) : helper)))
    + ": overview</title>\n<style>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"style"),depth0,{"name":"style","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "</style>\n</head>\n<body>\n<a class=\"skip\" href=\"#answer\">To the answer</a>\n<header class=\"masthead\">\n<div class=\"brand\">"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"mark"),depth0,{"name":"mark","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "</div>\n<div>\n<h1>"
    + alias4((((helper = lookupProperty(helpers,"title") || alias1(depth0, "title", {"start":{"line":18,"column":6},"end":{"line":18,"column":11}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"title","hash":{},"data":data,"loc":{"start":{"line":18,"column":4},"end":{"line":18,"column":13}}}) : helper)))
    + "</h1>\n</div>\n</header>\n<section class=\"first\" id=\"answer\" aria-labelledby=\"answer-heading\">\n<h2 id=\"answer-heading\" class=\"quiet\">Answer</h2>\n<div class=\"answer\">\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"answer"),{"name":"each","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":24,"column":0},"end":{"line":26,"column":9}}})) != null ? stack1 : "")
    + "</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"failures"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":28,"column":0},"end":{"line":37,"column":7}}})) != null ? stack1 : "")
    + "</section>\n<main>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"changes"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":40,"column":0},"end":{"line":56,"column":7}}})) != null ? stack1 : "")
    + "<section id=\"runs\" aria-labelledby=\"runs-heading\">\n<h2 id=\"runs-heading\"><span class=\"no\">"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"changes"),{"name":"if","hash":{},"fn":container.program(10, data, 0),"inverse":container.program(11, data, 0),"data":data,"loc":{"start":{"line":58,"column":39},"end":{"line":58,"column":71}}})) != null ? stack1 : "")
    + "</span> What came of each run?</h2>\n<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\"Runs\">\n<table>\n<caption>Runs, each with its chosen model</caption>\n<thead><tr><th scope=\"col\">run</th><th scope=\"col\">outcome</th><th scope=\"col\">chosen</th><th scope=\"col\" class=\"n\">rows used</th><th scope=\"col\" class=\"n\">adjusted R²</th><th scope=\"col\" class=\"n\">residual standard error</th><th scope=\"col\" class=\"n\">criteria met</th><th scope=\"col\" class=\"n\">concerns</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"runs"),{"name":"each","hash":{},"fn":container.program(12, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":64,"column":0},"end":{"line":66,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n<p class=\"small\">A concern is a question put to the chosen model that found something; the run's report says which, and what to do.</p>\n</section>\n<section id=\"coefficients\" aria-labelledby=\"coefficients-heading\">\n<h2 id=\"coefficients-heading\"><span class=\"no\">"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"changes"),{"name":"if","hash":{},"fn":container.program(13, data, 0),"inverse":container.program(10, data, 0),"data":data,"loc":{"start":{"line":73,"column":47},"end":{"line":73,"column":79}}})) != null ? stack1 : "")
    + "</span> How do the coefficients compare?</h2>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"coefficients"),{"name":"each","hash":{},"fn":container.program(14, data, 0),"inverse":container.program(20, data, 0),"data":data,"loc":{"start":{"line":74,"column":0},"end":{"line":91,"column":9}}})) != null ? stack1 : "")
    + "</section>\n</main>\n<footer>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"mark"),depth0,{"name":"mark","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "<p>"
    + alias4((((helper = lookupProperty(helpers,"title") || alias1(depth0, "title", {"start":{"line":96,"column":5},"end":{"line":96,"column":10}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"title","hash":{},"data":data,"loc":{"start":{"line":96,"column":3},"end":{"line":96,"column":12}}}) : helper)))
    + ". Made by "
    + alias4((((helper = lookupProperty(helpers,"tool") || alias1(depth0, "tool", {"start":{"line":96,"column":24},"end":{"line":96,"column":28}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"tool","hash":{},"data":data,"loc":{"start":{"line":96,"column":22},"end":{"line":96,"column":30}}}) : helper)))
    + " from the records of the runs.</p>\n</footer>\n</body>\n</html>\n";
},"usePartial":true,"useData":true};
export const OVERVIEW_MARKDOWN: unknown = {"0":function(container,depth0,helpers,partials,data) {
    var stack1;

  return ((stack1 = container.lambda(depth0, depth0)) != null ? stack1 : "")
    + "\n\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "**Look at these first**\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"failures"),{"name":"each","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":0},"end":{"line":12,"column":9}}})) != null ? stack1 : "")
    + "\n";
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "1. **"
    + ((stack1 = (((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":11,"column":7},"end":{"line":11,"column":11}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":11,"column":5},"end":{"line":11,"column":13}}}) : helper))) != null ? stack1 : "")
    + "**: "
    + ((stack1 = (((helper = lookupProperty(helpers,"outcome") || alias1(depth0, "outcome", {"start":{"line":11,"column":19},"end":{"line":11,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"outcome","hash":{},"data":data,"loc":{"start":{"line":11,"column":17},"end":{"line":11,"column":28}}}) : helper))) != null ? stack1 : "")
    + ". "
    + ((stack1 = (((helper = lookupProperty(helpers,"why") || alias1(depth0, "why", {"start":{"line":11,"column":32},"end":{"line":11,"column":35}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"why","hash":{},"data":data,"loc":{"start":{"line":11,"column":30},"end":{"line":11,"column":37}}}) : helper))) != null ? stack1 : "")
    + "\n";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "## What changed since the earlier records?\n\n| run | outcome | choice | moved most | by, in earlier standard errors | new rows inside | criteria met |\n|:--|:--|:--|:--|--:|--:|--:|\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"changes"),"rows"),{"name":"each","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":20,"column":0},"end":{"line":22,"column":9}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = container.lambda(container.strict(lookupProperty(depth0,"changes"), "note", {"start":{"line":24,"column":2},"end":{"line":24,"column":14}} ), depth0)) != null ? stack1 : "")
    + "\n\n";
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), alias2=container.strict, alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"link"),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.program(6, data, 0),"data":data,"loc":{"start":{"line":21,"column":2},"end":{"line":21,"column":57}}})) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"outcome") || alias2(depth0, "outcome", {"start":{"line":21,"column":62},"end":{"line":21,"column":69}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"outcome","hash":{},"data":data,"loc":{"start":{"line":21,"column":60},"end":{"line":21,"column":71}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"marked"),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.program(8, data, 0),"data":data,"loc":{"start":{"line":21,"column":74},"end":{"line":21,"column":127}}})) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"moved") || alias2(depth0, "moved", {"start":{"line":21,"column":132},"end":{"line":21,"column":137}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"moved","hash":{},"data":data,"loc":{"start":{"line":21,"column":130},"end":{"line":21,"column":139}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"errors") || alias2(depth0, "errors", {"start":{"line":21,"column":144},"end":{"line":21,"column":150}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"errors","hash":{},"data":data,"loc":{"start":{"line":21,"column":142},"end":{"line":21,"column":152}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"inside") || alias2(depth0, "inside", {"start":{"line":21,"column":157},"end":{"line":21,"column":163}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"inside","hash":{},"data":data,"loc":{"start":{"line":21,"column":155},"end":{"line":21,"column":165}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"criteria") || alias2(depth0, "criteria", {"start":{"line":21,"column":170},"end":{"line":21,"column":178}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"criteria","hash":{},"data":data,"loc":{"start":{"line":21,"column":168},"end":{"line":21,"column":180}}}) : helper))) != null ? stack1 : "")
    + " |\n";
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "["
    + ((stack1 = (((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":21,"column":17},"end":{"line":21,"column":21}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":21,"column":15},"end":{"line":21,"column":23}}}) : helper))) != null ? stack1 : "")
    + "]("
    + ((stack1 = (((helper = lookupProperty(helpers,"link") || alias1(depth0, "link", {"start":{"line":21,"column":27},"end":{"line":21,"column":31}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"link","hash":{},"data":data,"loc":{"start":{"line":21,"column":25},"end":{"line":21,"column":33}}}) : helper))) != null ? stack1 : "")
    + ")";
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = (((helper = lookupProperty(helpers,"name") || container.strict(depth0, "name", {"start":{"line":21,"column":44},"end":{"line":21,"column":48}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"name","hash":{},"data":data,"loc":{"start":{"line":21,"column":42},"end":{"line":21,"column":50}}}) : helper))) != null ? stack1 : "");
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "**"
    + ((stack1 = (((helper = lookupProperty(helpers,"choice") || container.strict(depth0, "choice", {"start":{"line":21,"column":92},"end":{"line":21,"column":98}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"choice","hash":{},"data":data,"loc":{"start":{"line":21,"column":90},"end":{"line":21,"column":100}}}) : helper))) != null ? stack1 : "")
    + "**";
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = (((helper = lookupProperty(helpers,"choice") || container.strict(depth0, "choice", {"start":{"line":21,"column":112},"end":{"line":21,"column":118}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"choice","hash":{},"data":data,"loc":{"start":{"line":21,"column":110},"end":{"line":21,"column":120}}}) : helper))) != null ? stack1 : "");
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), alias2=container.strict, alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"link"),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.program(6, data, 0),"data":data,"loc":{"start":{"line":32,"column":2},"end":{"line":32,"column":57}}})) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"outcome") || alias2(depth0, "outcome", {"start":{"line":32,"column":62},"end":{"line":32,"column":69}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"outcome","hash":{},"data":data,"loc":{"start":{"line":32,"column":60},"end":{"line":32,"column":71}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"chosen") || alias2(depth0, "chosen", {"start":{"line":32,"column":76},"end":{"line":32,"column":82}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"chosen","hash":{},"data":data,"loc":{"start":{"line":32,"column":74},"end":{"line":32,"column":84}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"rows") || alias2(depth0, "rows", {"start":{"line":32,"column":89},"end":{"line":32,"column":93}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"rows","hash":{},"data":data,"loc":{"start":{"line":32,"column":87},"end":{"line":32,"column":95}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"adjusted") || alias2(depth0, "adjusted", {"start":{"line":32,"column":100},"end":{"line":32,"column":108}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"adjusted","hash":{},"data":data,"loc":{"start":{"line":32,"column":98},"end":{"line":32,"column":110}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"error") || alias2(depth0, "error", {"start":{"line":32,"column":115},"end":{"line":32,"column":120}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"error","hash":{},"data":data,"loc":{"start":{"line":32,"column":113},"end":{"line":32,"column":122}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"criteria") || alias2(depth0, "criteria", {"start":{"line":32,"column":127},"end":{"line":32,"column":135}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"criteria","hash":{},"data":data,"loc":{"start":{"line":32,"column":125},"end":{"line":32,"column":137}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"concerns") || alias2(depth0, "concerns", {"start":{"line":32,"column":142},"end":{"line":32,"column":150}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"concerns","hash":{},"data":data,"loc":{"start":{"line":32,"column":140},"end":{"line":32,"column":152}}}) : helper))) != null ? stack1 : "")
    + " |\n";
},"10":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "## Coefficients for "
    + ((stack1 = (((helper = lookupProperty(helpers,"quantity") || container.strict(depth0, "quantity", {"start":{"line":36,"column":22},"end":{"line":36,"column":30}} ))),(typeof helper === "function" ? helper.call(alias1,{"name":"quantity","hash":{},"data":data,"loc":{"start":{"line":36,"column":20},"end":{"line":36,"column":32}}}) : helper))) != null ? stack1 : "")
    + "\n\n| run |"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"names"),{"name":"each","hash":{},"fn":container.program(11, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":38,"column":7},"end":{"line":38,"column":42}}})) != null ? stack1 : "")
    + "\n|:--|"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"names"),{"name":"each","hash":{},"fn":container.program(12, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":39,"column":5},"end":{"line":39,"column":33}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"runs"),{"name":"each","hash":{},"fn":container.program(13, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":40,"column":0},"end":{"line":42,"column":9}}})) != null ? stack1 : "")
    + "\nStandard errors stand in brackets."
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"more"),{"name":"if","hash":{},"fn":container.program(16, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":44,"column":34},"end":{"line":44,"column":62}}})) != null ? stack1 : "")
    + "\n\n";
},"11":function(container,depth0,helpers,partials,data) {
    var stack1;

  return " "
    + ((stack1 = container.lambda(depth0, depth0)) != null ? stack1 : "")
    + " |";
},"12":function(container,depth0,helpers,partials,data) {
    return "--:|";
},"13":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| "
    + ((stack1 = (((helper = lookupProperty(helpers,"name") || container.strict(depth0, "name", {"start":{"line":41,"column":4},"end":{"line":41,"column":8}} ))),(typeof helper === "function" ? helper.call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":41,"column":2},"end":{"line":41,"column":10}}}) : helper))) != null ? stack1 : "")
    + " |"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"cells"),{"name":"each","hash":{},"fn":container.program(14, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":41,"column":12},"end":{"line":41,"column":83}}})) != null ? stack1 : "")
    + "\n";
},"14":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + ((stack1 = (((helper = lookupProperty(helpers,"estimate") || container.strict(depth0, "estimate", {"start":{"line":41,"column":30},"end":{"line":41,"column":38}} ))),(typeof helper === "function" ? helper.call(alias1,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":41,"column":28},"end":{"line":41,"column":40}}}) : helper))) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"error"),{"name":"if","hash":{},"fn":container.program(15, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":41,"column":40},"end":{"line":41,"column":72}}})) != null ? stack1 : "")
    + " |";
},"15":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " ("
    + ((stack1 = (((helper = lookupProperty(helpers,"error") || container.strict(depth0, "error", {"start":{"line":41,"column":57},"end":{"line":41,"column":62}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"error","hash":{},"data":data,"loc":{"start":{"line":41,"column":55},"end":{"line":41,"column":64}}}) : helper))) != null ? stack1 : "")
    + ")";
},"16":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + ((stack1 = (((helper = lookupProperty(helpers,"more") || container.strict(depth0, "more", {"start":{"line":44,"column":49},"end":{"line":44,"column":53}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"more","hash":{},"data":data,"loc":{"start":{"line":44,"column":47},"end":{"line":44,"column":55}}}) : helper))) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "# "
    + ((stack1 = (((helper = lookupProperty(helpers,"title") || alias1(depth0, "title", {"start":{"line":1,"column":4},"end":{"line":1,"column":9}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"title","hash":{},"data":data,"loc":{"start":{"line":1,"column":2},"end":{"line":1,"column":11}}}) : helper))) != null ? stack1 : "")
    + "\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"answer"),{"name":"each","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":6,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"failures"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":7,"column":0},"end":{"line":14,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"changes"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":0},"end":{"line":26,"column":7}}})) != null ? stack1 : "")
    + "## What came of each run?\n\n| run | outcome | chosen | rows used | adjusted R² | residual standard error | criteria met | concerns |\n|:--|:--|:--|--:|--:|--:|--:|--:|\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"runs"),{"name":"each","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":31,"column":0},"end":{"line":33,"column":9}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"coefficients"),{"name":"each","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":35,"column":0},"end":{"line":46,"column":9}}})) != null ? stack1 : "")
    + "---\n\nMade by "
    + ((stack1 = (((helper = lookupProperty(helpers,"tool") || alias1(depth0, "tool", {"start":{"line":49,"column":10},"end":{"line":49,"column":14}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"tool","hash":{},"data":data,"loc":{"start":{"line":49,"column":8},"end":{"line":49,"column":16}}}) : helper))) != null ? stack1 : "")
    + " from the records of the runs.\n";
},"useData":true};
